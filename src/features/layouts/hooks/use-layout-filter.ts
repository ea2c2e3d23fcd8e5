import { useSearchParams } from 'react-router'
import { layoutStatusSchema } from '@shared/protocol/layouts'
import { type LayoutFilter, SORTINGS } from '../arrange-layouts'

/** The filter lives in the address: it survives a reload and can be sent to a colleague. */
export function useLayoutFilter() {
  const [parameters, setParameters] = useSearchParams()
  const status = layoutStatusSchema.safeParse(parameters.get('status'))
  const filter: LayoutFilter = {
    search: parameters.get('search') ?? '',
    status: status.success ? status.data : 'all',
    project: parameters.get('project'),
    sorting: SORTINGS.find((sorting) => sorting === parameters.get('sort')) ?? 'edited',
  }
  const isArchived = parameters.get('archived') === 'true'

  /** Null removes a parameter, which is its default. */
  const setParameter = (name: string, value: string | null) =>
    setParameters(
      (current) => {
        const next = new URLSearchParams(current)
        if (value === null) next.delete(name)
        else next.set(name, value)
        return next
      },
      { replace: true },
    )
  const clear = () => setParameters(isArchived ? { archived: 'true' } : {}, { replace: true })

  return { filter, isArchived, setParameter, clear }
}
