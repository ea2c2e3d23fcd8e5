/** The columns of the page of layouts. */
export const CARD_GRID = 'grid gap-5 md:grid-cols-2 xl:grid-cols-3'
