/** Words for targets and fields, for notices such as "length of Pinion". */
import { findTarget } from './find-target'
import type { LayoutDocument } from './layout-document'
import type { Operation, Target } from './operations'
import { targetOfAdded } from './target-of-added'

/** "Pinion", "section 2", "load on Pinion". Falls back to the id when the target is gone. */
export function targetWords(document: LayoutDocument, target: Target): string {
  switch (target.kind) {
    case 'layout':
      return 'the layout'
    case 'shaft':
      return 'the shaft'
    case 'criteria':
      return 'the acceptance criteria'
    case 'section': {
      const at = document.shaft.sections.findIndex((section) => section.id === target.id)
      return at < 0 ? 'a shaft section' : `shaft section ${at + 1}`
    }
    case 'hub':
    case 'bearing':
    case 'loadCase': {
      const found = findTarget(document, target)
      return typeof found?.['name'] === 'string' ? found['name'] : MISSING_WORDS[target.kind]
    }
    case 'load': {
      const loadCase = document.loadCases.find((each) => each.id === target.loadCaseId)
      const hubId = loadCase?.loads.find((load) => load.id === target.id)?.hub
      return hubId === undefined ? 'a load' : `load on ${targetWords(document, { kind: 'hub', id: hubId })}`
    }
    case 'timing':
      return `timing of ${targetWords(document, { kind: 'hub', id: target.hub })}`
  }
}

const MISSING_WORDS = { hub: 'a hub', bearing: 'a bearing', loadCase: 'a load case' } as const

/** "length of Pinion": the target and the field, where there is one. */
export function operationWords(document: LayoutDocument, operation: Operation): string {
  switch (operation.type) {
    case 'set': {
      return `${fieldWords(operation.field)} of ${targetWords(document, operation.target)}`
    }
    case 'add': {
      if ('name' in operation.item) return operation.item.name
      return targetWords(document, targetOfAdded(operation))
    }
    case 'remove':
      return operation.name ?? targetWords(document, operation.target)
    case 'reorder':
      return `order of ${targetWords(document, operation.target)}`
  }
}

/** `outerDiameterMm` reads "outer diameter": the unit belongs to the number, not to the name. */
export function fieldWords(field: string): string {
  const [head = '', leaf] = field.split(/\.(.*)/s)
  if (head === 'hubTemperaturesC') return 'own temperature of a hub'
  if (leaf === undefined) return camelWords(head)
  return `${camelWords(head)} ${camelWords(leaf)}`
}

const UNIT_ENDING = /(MPa|KgM3|PerK|NPerUm|PerUm|Mrad|Rpm|Deg|Nm|Mm|Um|Kg|N|C|K)$/

function camelWords(name: string): string {
  const [bare, axis] = splitAxis(name.replace(UNIT_ENDING, ''))
  return `${bare.replace(/([A-Z])/g, ' $1').toLowerCase()}${axis}`.trim()
}

/** The Y of `forceY` is an axis, not a word. */
function splitAxis(name: string): [string, string] {
  const match = /^(force|moment)([YZ])$/.exec(name)
  return match ? [match[1] ?? name, ` ${match[2]?.toLowerCase()}`] : [name, '']
}
