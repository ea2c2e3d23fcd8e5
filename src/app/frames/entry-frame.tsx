import { Outlet } from 'react-router'
import { Mark } from '@/components/mark'
import { EntryDrawing } from './entry-drawing'

/** Sign-in and its neighbours: the form on paper, a drawn shaft beside it where there is room. */
export function EntryFrame() {
  return (
    <div className="grid min-h-dvh lg:grid-cols-[minmax(26rem,2fr)_3fr]">
      <main id="main" className="flex flex-col px-6 py-8 sm:px-12">
        <p className="flex items-center gap-3 text-xl font-bold">
          <Mark />
          Hubstead
        </p>
        <div className="mx-auto my-auto w-full max-w-sm py-10">
          <Outlet />
        </div>
      </main>
      <EntryDrawing />
    </div>
  )
}
