import { useQuery } from '@tanstack/react-query'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { ShaftThumbnail } from '@/drawings/shaft-thumbnail'
import { messageOf } from '@/lib/http-client'
import { examplesQuery } from '../api/examples'

/** Starting examples with the story of each; one is chosen like a radio button. */
export function ExampleChoice({
  value,
  onChange,
}: {
  value: string | null
  onChange: (exampleId: string) => void
}) {
  const { data: examples, error, isFetching, refetch } = useQuery(examplesQuery)
  if (!examples)
    return error ? (
      <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
    ) : (
      <Spinner label="Loading the examples" />
    )
  return (
    <fieldset>
      <legend className="sr-only">Example</legend>
      <div className="border-t border-hairline">
        {examples.map((example) => (
          <label
            key={example.id}
            className="grid cursor-pointer gap-x-5 gap-y-2 border-b border-hairline p-3 outline-offset-[-2px] outline-steel hover:bg-paper has-checked:bg-steel-soft has-focus-visible:outline-2 sm:grid-cols-[13rem_1fr]"
          >
            <ShaftThumbnail thumbnail={example.thumbnail} label={`Half section of ${example.name}`} />
            <span className="grid content-center gap-1">
              <span className="flex items-center gap-2 font-bold">
                <input
                  type="radio"
                  name="example"
                  className="size-4 accent-steel"
                  checked={value === example.id}
                  onChange={() => onChange(example.id)}
                />
                {example.name}
              </span>
              <span className="text-sm text-quiet">{example.story}</span>
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  )
}
