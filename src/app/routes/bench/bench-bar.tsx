/** The dark bar of the bench. */
import { useCallback } from 'react'
import { PeopleStack } from '@/features/collaboration/people-stack'
import { ReleaseActions } from '@/features/releases/release-actions'
import { useSelectionStore } from '@/stores/selection-store'
import { TopBar } from '../../frames/top-bar'
import { BenchTitle } from './bench-title'

export function BenchBar({ layoutId }: { layoutId: string }) {
  const goTo = useCallback((partIds: string[]) => useSelectionStore.getState().select(partIds), [])
  return (
    <TopBar
      title={<BenchTitle />}
      actions={
        <>
          <PeopleStack onGoTo={goTo} />
          <ReleaseActions layoutId={layoutId} />
        </>
      }
    />
  )
}
