/**
 * A stepped shaft with three hubs in half section over the interference window: what the product is about,
 * in one drawing. Decoration only, so it is hidden from screen readers and from narrow screens.
 */
const HATCH = 'entry-hatch'

function Hub({ x, width, seat, outer }: { x: number; width: number; seat: number; outer: number }) {
  return (
    <g>
      <rect x={x} y={200 - outer} width={width} height={outer - seat} fill={`url(#${HATCH})`} />
      <rect x={x} y={200 - outer} width={width} height={outer - seat} className="fill-none stroke-ink" />
      <rect x={x} y={200 + seat} width={width} height={outer - seat} className="fill-card stroke-ink" />
      <path
        d={`M${x} ${200 - seat}h${width}M${x} ${200 + seat}h${width}`}
        className="stroke-good"
        strokeWidth="5"
      />
    </g>
  )
}

export function EntryDrawing() {
  return (
    <div className="hidden items-center justify-center border-l border-hairline bg-card px-12 lg:flex">
      <figure aria-hidden="true" className="w-full max-w-3xl">
        <svg viewBox="0 0 640 470" className="w-full" fontSize="13">
          <defs>
            <pattern
              id={HATCH}
              width="9"
              height="9"
              patternUnits="userSpaceOnUse"
              patternTransform="rotate(45)"
            >
              <rect width="9" height="9" className="fill-paper" />
              <path d="M0 0v9" className="stroke-edge" strokeWidth="1.4" />
            </pattern>
          </defs>
          <g strokeWidth="1.6" className="fill-card stroke-ink">
            <rect x="40" y="162" width="70" height="76" />
            <rect x="110" y="152" width="110" height="96" />
            <rect x="220" y="142" width="230" height="116" />
            <rect x="450" y="130" width="26" height="140" />
            <rect x="476" y="152" width="70" height="96" />
            <rect x="546" y="162" width="54" height="76" />
          </g>
          <g strokeWidth="1.6">
            <Hub x={128} width={72} seat={48} outer={96} />
            <Hub x={240} width={84} seat={58} outer={138} />
            <Hub x={350} width={100} seat={58} outer={168} />
            {[58, 562].map((x) => (
              <g key={x} className="fill-steel-soft stroke-steel">
                <rect x={x - 2} y={124} width="30" height="38" />
                <circle cx={x + 13} cy="143" r="9" className="fill-card" />
                <rect x={x - 2} y={238} width="30" height="38" />
                <circle cx={x + 13} cy="257" r="9" className="fill-card" />
              </g>
            ))}
          </g>
          <path d="M20 200h600" className="stroke-quiet" strokeDasharray="16 4 3 4" />

          <g transform="translate(120 410)">
            <rect x="0" y="0" width="400" height="20" rx="3" className="fill-bad-soft" />
            <rect x="84" y="0" width="240" height="20" className="fill-good-soft" />
            <rect x="140" y="4" width="120" height="12" rx="2" className="fill-good" />
            <path d="M84 -8v36M324 -8v36" className="stroke-ink" strokeWidth="1.6" />
            <g className="fill-quiet" fontWeight="500">
              <text x="84" y="46" textAnchor="middle">
                slips below
              </text>
              <text x="324" y="46" textAnchor="middle">
                yields above
              </text>
            </g>
            <text x="200" y="-10" textAnchor="middle" className="fill-good" fontWeight="700">
              the band of the tolerances
            </text>
          </g>
        </svg>
        <figcaption className="mt-8 text-center text-quiet">
          Every hub holds at its loosest, no hub yields at its tightest.
        </figcaption>
      </figure>
    </div>
  )
}
