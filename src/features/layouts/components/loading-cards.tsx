/** The shape of what is coming, so that nothing jumps when it is there. */
export function LoadingCards() {
  return (
    <div
      role="status"
      aria-label="Loading the layouts"
      className="grid animate-pulse grid-cols-[repeat(auto-fill,minmax(min(23rem,100%),1fr))] gap-5"
    >
      {[0, 1, 2].map((card) => (
        <div key={card} className="h-72 border border-hairline bg-card" />
      ))}
    </div>
  )
}
