import { useShallow } from 'zustand/react/shallow'
import { useLayoutStore } from '@/stores/layout-store'
import { fieldWords } from '@shared/layout/field-words'

/** "Tomas is editing length": others typing in any field of a part. */
export function EditingNow({ partKey }: { partKey: string }) {
  const people = useLayoutStore(
    useShallow((state) =>
      state.people
        .filter(
          ({ connectionId, editing }) =>
            connectionId !== state.you?.connectionId && editing?.startsWith(partKey),
        )
        .map(
          ({ name, editing }) =>
            `${name.split(' ')[0]} is editing ${fieldWords((editing ?? '').slice(partKey.length))}`,
        ),
    ),
  )
  return people.map((words) => (
    <span key={words} className="text-good">
      {' '}
      · {words}
    </span>
  ))
}
