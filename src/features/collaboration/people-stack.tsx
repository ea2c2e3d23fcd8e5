/** Who is in this layout now, as overlapping initials in the bar; pressing opens the list with what each one does. */
import { useMemo } from 'react'
import { Avatar } from '@/components/avatar'
import { Menu, type MenuItem } from '@/components/menu'
import { useLayoutStore } from '@/stores/layout-store'
import { activityWords } from './presence-words'
import { peopleHere } from './use-others'

const SHOWN = 4

/** `onGoTo` brings what the person has selected into sight. */
export function PeopleStack({ onGoTo }: { onGoTo: (partIds: string[]) => void }) {
  const people = useLayoutStore((state) => state.people)
  const you = useLayoutStore((state) => state.you)
  const document = useLayoutStore((state) => state.visible)
  const here = useMemo(() => peopleHere(people, you?.userId ?? null), [people, you])
  const others = here.filter(({ isYou }) => !isYou)
  if (others.length === 0) return null

  const items = others.flatMap((person): MenuItem[] => {
    const selection = person.windows.flatMap((window) => window.selection)
    const doing = person.windows.map((window) => activityWords(document, window.editing)).find(Boolean)
    return [
      {
        label: `${person.name}${doing ? `, ${doing}` : selection.length > 0 ? ', has a selection' : ', looking'}`,
        icon: 'eye',
        isDisabled: selection.length === 0,
        onSelect: () => onGoTo(selection),
      },
    ]
  })

  return (
    <Menu
      label={`${others.length === 1 ? '1 other person' : `${others.length} other people`} here: ${others.map(({ name }) => name).join(', ')}`}
      buttonClassName="flex rounded-full pl-2"
      button={
        <span className="flex">
          {others.slice(0, SHOWN).map((person) => (
            <span key={person.userId} className="-ml-2 rounded-full ring-2 ring-bar">
              <Avatar name={person.name} colourIndex={person.colourIndex} />
            </span>
          ))}
          {others.length > SHOWN && (
            <span className="-ml-2 flex size-8 items-center justify-center rounded-full bg-bar-line text-xs font-bold ring-2 ring-bar">
              +{others.length - SHOWN}
            </span>
          )}
        </span>
      }
      items={[{ kind: 'heading', label: 'Here now. Choose one to see the selection.' }, ...items]}
    />
  )
}
