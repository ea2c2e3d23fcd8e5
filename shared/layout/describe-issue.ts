import type { z } from 'zod'

type Issue = z.core.$ZodIssue

interface DescribedIssue {
  path: string
  message: string
}

/** A schema issue in plain words, with a path into the file as it was given. */
export function describeIssue(issue: Issue, content: unknown): DescribedIssue[] {
  return describe(issue, [], content)
}

function describe(issue: Issue, prefix: readonly PropertyKey[], content: unknown): DescribedIssue[] {
  const path = [...prefix, ...issue.path]
  const at = pathText(path)
  switch (issue.code) {
    case 'invalid_type':
      return valueAt(content, path) === undefined
        ? [{ path: at, message: `Missing: ${TYPE_WORDS[issue.expected] ?? issue.expected} is needed here` }]
        : [{ path: at, message: `Should be ${TYPE_WORDS[issue.expected] ?? issue.expected}` }]
    case 'invalid_value':
      return [
        { path: at, message: `Should be ${issue.values.map((value) => JSON.stringify(value)).join(' or ')}` },
      ]
    case 'too_small':
      return [{ path: at, message: tooSmall(issue) }]
    case 'too_big':
      return [{ path: at, message: tooBig(issue) }]
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({ path: pathText([...path, key]), message: 'Unknown field' }))
    case 'invalid_key':
      return [{ path: at, message: 'This is not an id' }]
    case 'invalid_union':
      return describeUnion(issue, path, content)
    case 'invalid_format':
    case 'custom':
    case 'not_multiple_of':
    case 'invalid_element':
      return [{ path: at, message: issue.message }]
  }
}

/** Of the branches of a union the one that fits the given type best is worth talking about. */
function describeUnion(
  issue: z.core.$ZodIssueInvalidUnion,
  path: readonly PropertyKey[],
  content: unknown,
): DescribedIssue[] {
  const options = 'options' in issue && Array.isArray(issue.options) ? issue.options : null
  if (options) {
    return [
      {
        path: pathText(path),
        message: `Should be ${options.map((option) => JSON.stringify(option)).join(' or ')}`,
      },
    ]
  }
  const branch = issue.errors.find((issues) =>
    issues.every((inner) => inner.path.length > 0 || inner.code !== 'invalid_type'),
  )
  if (branch) return branch.flatMap((inner) => describe(inner, path, content))
  return [
    {
      path: pathText(path),
      message: valueAt(content, path) === undefined ? 'Missing' : 'Should be a library id or an object',
    },
  ]
}

const TYPE_WORDS: Record<string, string> = {
  string: 'a text',
  number: 'a finite number',
  boolean: 'true or false',
  object: 'an object',
  array: 'a list',
  record: 'an object',
  int: 'a whole number',
}

function tooSmall(issue: z.core.$ZodIssueTooSmall): string {
  if (issue.origin === 'string') return 'Should not be empty'
  return `Should be ${issue.inclusive ? 'at least' : 'more than'} ${issue.minimum}`
}

function tooBig(issue: z.core.$ZodIssueTooBig): string {
  if (issue.origin === 'string') return `At most ${issue.maximum} characters`
  if (issue.origin === 'array') return `At most ${issue.maximum} entries`
  return `Should be ${issue.inclusive ? 'at most' : 'less than'} ${issue.maximum}`
}

function valueAt(content: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      typeof value === 'object' && value !== null && Object.hasOwn(value, key)
        ? (value as Record<PropertyKey, unknown>)[key]
        : undefined,
    content,
  )
}

function pathText(path: readonly PropertyKey[]): string {
  return path
    .map((key, position) =>
      typeof key === 'number' ? `[${key}]` : `${position > 0 ? '.' : ''}${String(key)}`,
    )
    .join('')
}
