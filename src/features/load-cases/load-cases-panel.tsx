import { useLayoutStore } from '@/stores/layout-store'

export function LoadCasesPanel() {
  const layout = useLayoutStore((state) => state.visible)
  if (layout === null) return null
  return (
    <ul aria-label="Load cases">
      {layout.loadCases.map((item) => (
        <li key={item.id}>{'name' in item ? item.name : item.id}</li>
      ))}
    </ul>
  )
}
