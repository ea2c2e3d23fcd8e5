import { useResultsStore } from '@/stores/results-store'

export function FindingsList() {
  const findings = useResultsStore((state) => state.results?.findings)
  return (
    <ul aria-label="Findings">
      {findings?.map(({ code, part, loadCase, message, remedy }) => (
        <li key={`${code} ${part} ${loadCase}`}>
          {message} {remedy}
        </li>
      ))}
    </ul>
  )
}
