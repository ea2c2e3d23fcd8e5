/** Every shortcut, made from the actions themselves, and what the mouse does with which key held. */
import { Dialog } from '@/components/dialog'
import { type ActionGroup, chordText } from '../actions/action'
import { ALL_ACTIONS } from '../actions/all-actions'

const GROUPS: readonly ActionGroup[] = ['Tools', 'Edit', 'Parts', 'View']

const POINTER_HABITS: readonly [keys: string, what: string][] = [
  ['← →', 'Shift the selected parts by 1 mm; with Shift by 10 mm, with Alt by 0.1 mm'],
  [
    'Drag a hub',
    'Moves it with its loads. Its shoulder stays; a hub that leaves it is shown in the findings',
  ],
  ['Drag a face', 'Changes the length; the other face stays'],
  ['Drag a step', 'Only this step moves: the next section gives or takes the length and all parts stay'],
  ['Shift + drag a step', 'The shaft gets longer or shorter and everything right of the step goes along'],
  ['Alt while dragging', 'Free value: no snapping, no grid'],
  ['Shift + click', 'Adds a part to the selection, or takes it out'],
  ['Wheel', 'Zooms at the pointer; with Shift it scrolls sideways'],
  ['Two fingers', 'Scroll; pinch to zoom'],
  ['Space or middle button + drag', 'Shifts the drawing'],
]

const KEY = 'rounded border border-hairline bg-paper px-1.5 py-0.5 text-xs font-semibold whitespace-nowrap'

export function ShortcutsDialog({ onClose }: { onClose: () => void }) {
  return (
    <Dialog title="Keyboard and mouse" onClose={onClose} size="lg">
      <div className="grid gap-x-10 gap-y-6 md:grid-cols-2">
        {GROUPS.map((group) => (
          <section key={group}>
            <h3 className="mb-1.5 text-sm font-bold text-plum">{group}</h3>
            <dl className="text-sm">
              {ALL_ACTIONS.filter((action) => action.group === group).map((action) => (
                <div key={action.id} className="flex justify-between gap-4 border-b border-hairline py-1">
                  <dt>{action.label}</dt>
                  <dd className="flex shrink-0 items-start gap-1">
                    {action.chords.map((chord) => (
                      <kbd key={chordText(chord)} className={KEY}>
                        {chordText(chord)}
                      </kbd>
                    ))}
                  </dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
        <section className="md:col-span-2">
          <h3 className="mb-1.5 text-sm font-bold text-plum">On the drawing</h3>
          <dl className="text-sm">
            {POINTER_HABITS.map(([keys, what]) => (
              <div key={keys} className="flex gap-4 border-b border-hairline py-1">
                <dt className="w-52 shrink-0">
                  <kbd className={KEY}>{keys}</kbd>
                </dt>
                <dd>{what}</dd>
              </div>
            ))}
          </dl>
        </section>
      </div>
    </Dialog>
  )
}
