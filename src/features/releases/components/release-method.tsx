/** How the stored results were computed, and what the model of that day left out. */
import type { ReleaseDetails } from '../api/release'

export function ReleaseMethod({ release }: { release: ReleaseDetails }) {
  const { method, results, engineVersion } = release
  return (
    <div className="grid max-w-4xl gap-6 text-sm">
      <section>
        <h3 className="font-bold">What the model does not cover</h3>
        <ul className="mt-1 list-disc space-y-1 pl-5">
          {method.notCovered.map((gap) => (
            <li key={gap}>{gap}</li>
          ))}
        </ul>
      </section>
      <section>
        <h3 className="font-bold">How it was computed, engine {engineVersion}</h3>
        <dl className="mt-1 divide-y divide-hairline">
          {method.method.map((step) => (
            <div key={step.title} className="grid gap-x-6 py-1.5 md:grid-cols-[12rem_1fr]">
              <dt className="font-semibold">{step.title}</dt>
              <dd>{step.text}</dd>
            </div>
          ))}
        </dl>
      </section>
      <section>
        <h3 className="font-bold">Cautions</h3>
        <ul className="mt-1 list-disc space-y-1 pl-5">
          {results.cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </section>
    </div>
  )
}
