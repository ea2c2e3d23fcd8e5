/**
 * Refused inputs. The core never answers a meaningless question with a number: it throws with a
 * code from this closed list and the path of the field, and recalculation turns that into a
 * "not computable" reason beside the field.
 */
export type EngineeringInputCode =
  | 'notFinite'
  | 'notPositive'
  | 'negative'
  | 'outOfRange'
  | 'boreNotInside'
  | 'unknownToleranceClass'
  | 'sizeOutOfRange'
  | 'unknownMaterial'
  | 'emptyShaft'
  | 'unsupportedShaft'
  | 'numericallySingular'

export class EngineeringInputError extends Error {
  readonly code: EngineeringInputCode
  /** Where the refused value came in, such as `hub.outerDiameter`. */
  readonly path: string

  constructor(code: EngineeringInputCode, path: string, message: string) {
    super(message)
    this.name = 'EngineeringInputError'
    this.code = code
    this.path = path
  }
}

export function requireFinite(value: number, path: string): void {
  if (!Number.isFinite(value)) throw new EngineeringInputError('notFinite', path, `${path} is not a number`)
}

export function requirePositive(value: number, path: string): void {
  requireFinite(value, path)
  if (value <= 0) throw new EngineeringInputError('notPositive', path, `${path} must be greater than zero`)
}

export function requireNonNegative(value: number, path: string): void {
  requireFinite(value, path)
  if (value < 0) throw new EngineeringInputError('negative', path, `${path} must not be negative`)
}
