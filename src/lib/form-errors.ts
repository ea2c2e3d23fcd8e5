import { HttpError, messageOf } from './http-client'

interface FormErrors<Name extends string> {
  /** Shown at their field. */
  fields: Partial<Record<Name, string>>
  /** Shown above the form: what belongs to no field of it. */
  form: string | null
}

/** Sorts a refusal to the fields of a form; nothing the server said about other fields gets lost. */
export function formErrors<Name extends string>(error: unknown, names: readonly Name[]): FormErrors<Name> {
  if (!error) return { fields: {}, form: null }
  if (!(error instanceof HttpError)) return { fields: {}, form: messageOf(error) }
  const fields: Partial<Record<Name, string>> = {}
  const others: string[] = []
  for (const [path, message] of Object.entries(error.fields)) {
    const name = names.find((candidate) => candidate === path)
    if (name) fields[name] = message
    else others.push(message)
  }
  const isPlaced = Object.keys(fields).length > 0
  return { fields, form: others.length > 0 ? others.join(' ') : isPlaced ? null : error.message }
}
