import type { Evidence, ValidationTopic } from './validation-check'

/** One row of the table as it crosses from the worker to the page. */
export interface ValidationRow {
  id: string
  topic: ValidationTopic
  title: string
  citation: string
  place: string
  evidence: Evidence
  isFromMemory: boolean
  unit: string
  reference: number[]
  ours: number[]
  deviation: number
  tolerance: { kind: 'relative' | 'absolute'; value: number }
  reason: string
  passes: boolean
}

export type ValidationReply = { kind: 'rows'; rows: ValidationRow[] } | { kind: 'failed'; message: string }
