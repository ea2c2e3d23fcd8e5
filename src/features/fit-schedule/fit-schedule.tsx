import { useLayoutStore } from '@/stores/layout-store'

export function FitSchedule() {
  const layout = useLayoutStore((state) => state.visible)
  if (layout === null) return null
  return (
    <ul aria-label="Fit schedule">
      {layout.hubs.map((item) => (
        <li key={item.id}>{'name' in item ? item.name : item.id}</li>
      ))}
    </ul>
  )
}
