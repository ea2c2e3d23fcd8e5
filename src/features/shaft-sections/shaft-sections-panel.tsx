import { useLayoutStore } from '@/stores/layout-store'

export function ShaftSectionsPanel() {
  const layout = useLayoutStore((state) => state.visible)
  if (layout === null) return null
  return (
    <ul aria-label="Shaft sections">
      {layout.shaft.sections.map((item) => (
        <li key={item.id}>{'name' in item ? item.name : item.id}</li>
      ))}
    </ul>
  )
}
