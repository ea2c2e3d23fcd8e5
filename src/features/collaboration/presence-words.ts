/** What another person is doing, in words: "Tomas is editing length of Pinion". */
import { fieldWords, targetWords } from '@shared/layout/field-words'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Target } from '@shared/layout/operations'

/** Reads the name a field has in presence, such as `hub:A:lengthMm` or `load:run:load-1:torqueNm`. */
function readEditing(editing: string): { target: Target; field: string } | null {
  const [kind, ...rest] = editing.split(':')
  const field = rest.at(-1)
  if (field === undefined) return null
  switch (kind) {
    case 'layout':
    case 'shaft':
    case 'criteria':
      return { target: { kind }, field }
    case 'section':
    case 'hub':
    case 'bearing':
    case 'loadCase':
      return rest.length < 2 ? null : { target: { kind, id: rest.slice(0, -1).join(':') }, field }
    case 'load': {
      const [loadCaseId, ...inner] = rest
      return loadCaseId === undefined || inner.length < 2
        ? null
        : { target: { kind, loadCaseId, id: inner.slice(0, -1).join(':') }, field }
    }
    case 'timing':
      return rest.length < 2 ? null : { target: { kind, hub: rest.slice(0, -1).join(':') }, field }
    default:
      return null
  }
}

/** "editing length", for the tag beside a cursor. */
export function editingWords(editing: string | null): string | null {
  const read = editing === null ? null : readEditing(editing)
  return read && `editing ${fieldWords(read.field)}`
}

/** "editing length of Pinion", for the list of people. */
export function activityWords(document: LayoutDocument | null, editing: string | null): string | null {
  const read = editing === null ? null : readEditing(editing)
  if (!read) return null
  return document
    ? `editing ${fieldWords(read.field)} of ${targetWords(document, read.target)}`
    : `editing ${fieldWords(read.field)}`
}

export const firstName = (name: string) => name.trim().split(/\s+/)[0] ?? name
