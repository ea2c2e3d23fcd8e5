/**
 * A stepped shaft with three hubs in half section over the interference window: what the product is about,
 * in one drawing. Decoration only, so it is hidden from screen readers and from narrow screens. As few paths
 * as will do, since it is sent with the sign-in page.
 */
const SHAFT =
  'M40 162h70v76h-70zM110 152h110v96h-110zM220 142h230v116h-230zM450 130h26v140h-26zM476 152h70v96h-70zM546 162h54v76h-54z'
const HUBS_ABOVE = 'M128 104h72v48h-72zM240 62h84v80h-84zM350 32h100v110h-100z'
const HUBS_BELOW = 'M128 248h72v48h-72zM240 258h84v80h-84zM350 258h100v110h-100z'
const SEATS = 'M128 152h72m-72 96h72M240 142h84m-84 116h84M350 142h100m-100 116h100'
const BEARINGS = 'M56 124h30v38h-30zM56 238h30v38h-30zM560 124h30v38h-30zM560 238h30v38h-30z'
const ROLLERS =
  'M62 143a9 9 0 0 1 18 0a9 9 0 0 1-18 0zm0 114a9 9 0 0 1 18 0a9 9 0 0 1-18 0zM566 143a9 9 0 0 1 18 0a9 9 0 0 1-18 0zm0 114a9 9 0 0 1 18 0a9 9 0 0 1-18 0z'

export function EntryDrawing() {
  return (
    <div className="hidden items-center justify-center border-l border-hairline bg-card px-12 lg:flex">
      <figure aria-hidden="true" className="w-full max-w-3xl">
        <svg viewBox="0 0 640 470" strokeWidth="1.6" fontSize="13" textAnchor="middle">
          <pattern
            id="hatch"
            width="9"
            height="9"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path d="M0 0v9" className="stroke-edge" />
          </pattern>
          <path d={SHAFT + HUBS_BELOW} className="fill-card stroke-ink" />
          <path d={HUBS_ABOVE} className="fill-paper" />
          <path d={HUBS_ABOVE} fill="url(#hatch)" className="stroke-ink" />
          <path d={SEATS} className="stroke-good" strokeWidth="5" />
          <path d={BEARINGS} className="fill-steel-soft stroke-steel" />
          <path d={ROLLERS} className="fill-card stroke-steel" />
          <path d="M20 200h600" className="stroke-quiet" strokeDasharray="16 4 3 4" />

          <path d="M120 410h400v20h-400z" className="fill-bad-soft" />
          <path d="M204 410h240v20h-240z" className="fill-good-soft" />
          <path d="M260 414h120v12h-120z" className="fill-good" />
          <path d="M204 402v36m240-36v36" className="stroke-ink" />
          <g className="fill-quiet" fontWeight="500">
            <text x="204" y="456">
              slips below
            </text>
            <text x="444" y="456">
              yields above
            </text>
          </g>
          <text x="320" y="400" className="fill-good" fontWeight="700">
            the band of the tolerances
          </text>
        </svg>
        <figcaption className="mt-8 text-center text-quiet">
          Every hub holds at its loosest, no hub yields at its tightest.
        </figcaption>
      </figure>
    </div>
  )
}
