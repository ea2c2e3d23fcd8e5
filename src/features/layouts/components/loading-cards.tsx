import { CARD_GRID } from './card-grid'

/** The shape of what is coming, so that nothing jumps when it is there. */
export function LoadingCards() {
  return (
    <div role="status" aria-label="Loading the layouts" className={`${CARD_GRID} animate-pulse`}>
      {[0, 1, 2].map((card) => (
        <div key={card} className="h-72 border border-hairline bg-card" />
      ))}
    </div>
  )
}
