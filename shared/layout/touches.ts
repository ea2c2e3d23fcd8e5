/** Which fields and which parts operations change: to tell who changed the same thing. */
import { targetKey } from './find-target'
import type { Operation, SetOperation, Target } from './operations'

/** True when both set the same field, or one sets a part of what the other sets whole. */
export function setsSameField(left: SetOperation, right: SetOperation): boolean {
  if (targetKey(left.target) !== targetKey(right.target)) return false
  return (
    left.field === right.field ||
    left.field.startsWith(`${right.field}.`) ||
    right.field.startsWith(`${left.field}.`)
  )
}

/** True when the operation takes away the target, or the load case that a load belongs to. */
export function removesTarget(operation: Operation, target: Target): boolean {
  if (operation.type !== 'remove') return false
  if (targetKey(operation.target) === targetKey(target)) return true
  return (
    target.kind === 'load' &&
    operation.target.kind === 'loadCase' &&
    operation.target.id === target.loadCaseId
  )
}
