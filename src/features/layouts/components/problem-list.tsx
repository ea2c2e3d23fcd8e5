import type { LayoutFileProblem } from '@shared/layout/layout-file'

export function ProblemList({ problems }: { problems: LayoutFileProblem[] }) {
  return (
    <ul className="mt-1 grid max-h-60 gap-1 overflow-auto">
      {problems.map(({ path, message }, index) => (
        <li key={index}>
          {path && <code className="mr-2 font-sans font-semibold break-all">{path}</code>}
          {message}
        </li>
      ))}
    </ul>
  )
}
