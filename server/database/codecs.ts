/** SQLite stores neither booleans, dates nor objects: these are the only conversions. */

export const booleanToColumn = (value: boolean): 0 | 1 => (value ? 1 : 0)
export const booleanFromColumn = (value: 0 | 1 | number): boolean => value !== 0

/** UTC ISO text sorts as time does and reads the same in every database. */
export const dateToColumn = (value: Date): string => value.toISOString()
export const dateFromColumn = (value: string): Date => new Date(value)

export const jsonToColumn = (value: unknown): string => JSON.stringify(value)
/** The caller parses the result with the zod schema of what it stored. */
export const jsonFromColumn = (value: string): unknown => JSON.parse(value) as unknown
