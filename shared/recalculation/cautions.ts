/** Said by every results page, sheet and export. */
export const CAUTIONS_LINE =
  'Results support a qualified engineer and replace neither the applicable codes nor licensed practice.'
