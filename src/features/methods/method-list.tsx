import { methodStatements } from '@shared/validation/method-statement'
import { SOURCE_REGISTRY } from '@shared/engineering/sources/source-registry'

// The page reads the documentation of the code itself: there is no second copy that could differ.
const files = import.meta.glob<string>('../../../shared/engineering/*/*.ts', {
  query: '?raw',
  import: 'default',
  eager: true,
})

const TOPIC_WORDS: Record<string, string> = {
  tolerances: 'Limits and fits',
  'interference-fit': 'Interference fit',
  'load-cases': 'Load cases',
  'load-sources': 'Loads by their source',
  shaft: 'Shaft',
  assembly: 'Assembly',
  batch: 'Batch',
  contact: 'Contact of the whole shaft',
  materials: 'Materials',
}

const statements = Object.entries(files)
  .flatMap(([path, text]) => methodStatements(path.split('/').at(-2) ?? '', text))
  .filter((statement) => statement.topic in TOPIC_WORDS)

const topics = Object.keys(TOPIC_WORDS).filter((topic) => statements.some((one) => one.topic === topic))

/** `torqueCapacity` reads "Torque capacity". */
function inWords(name: string): string {
  const words = name.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase()
  return words.charAt(0).toUpperCase() + words.slice(1)
}

const cited = (source: string) => SOURCE_REGISTRY.filter(({ id }) => source.includes(id))

export function MethodList() {
  return (
    <>
      {topics.map((topic) => (
        <section key={topic} className="border-t border-hairline py-4">
          <h3 className="mb-2 font-bold">{TOPIC_WORDS[topic]}</h3>
          <dl className="grid gap-4 md:grid-cols-2">
            {statements
              .filter((statement) => statement.topic === topic)
              .map((statement) => (
                <div key={statement.name}>
                  <dt className="font-semibold">{inWords(statement.name)}</dt>
                  <dd className="text-sm">
                    <p>{statement.gives}</p>
                    <p className="mt-1">
                      <span className="text-quiet">Model: </span>
                      {statement.model}
                    </p>
                    <p className="mt-1">
                      <span className="text-quiet">Range: </span>
                      {statement.validity}
                    </p>
                    <ul className="mt-1 text-quiet">
                      {cited(statement.source).map((source) => (
                        <li key={source.id}>
                          {source.citation}
                          {source.isFromMemory && ' (from memory)'}
                        </li>
                      ))}
                    </ul>
                  </dd>
                </div>
              ))}
          </dl>
        </section>
      ))}
    </>
  )
}
