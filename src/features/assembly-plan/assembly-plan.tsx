import { useLayoutStore } from '@/stores/layout-store'

export function AssemblyPlan() {
  const layout = useLayoutStore((state) => state.visible)
  if (layout === null) return null
  return (
    <ul aria-label="Assembly plan">
      {layout.hubs.map((item) => (
        <li key={item.id}>{'name' in item ? item.name : item.id}</li>
      ))}
    </ul>
  )
}
