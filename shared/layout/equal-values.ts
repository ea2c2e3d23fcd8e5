/** Deep equality of JSON values; a missing key and an undefined one are the same. */
export function equalValues(left: unknown, right: unknown): boolean {
  if (Object.is(left, right)) return true
  if (typeof left !== 'object' || typeof right !== 'object' || left === null || right === null) {
    // -0 and 0 are one number to a reader and to JSON.
    return left === right
  }
  if (Array.isArray(left) || Array.isArray(right)) {
    if (!Array.isArray(left) || !Array.isArray(right) || left.length !== right.length) return false
    return left.every((item, position) => equalValues(item, right[position]))
  }
  const leftRecord = left as Record<string, unknown>
  const rightRecord = right as Record<string, unknown>
  const keys = new Set([...Object.keys(leftRecord), ...Object.keys(rightRecord)])
  for (const key of keys) {
    const leftValue = Object.hasOwn(leftRecord, key) ? leftRecord[key] : undefined
    const rightValue = Object.hasOwn(rightRecord, key) ? rightRecord[key] : undefined
    if (!equalValues(leftValue, rightValue)) return false
  }
  return true
}
