import { readFileSync } from 'node:fs'
import { expect, it } from 'vitest'
import { methodStatements } from '@shared/validation/method-statement'

const file = (path: string) =>
  readFileSync(new URL(`../../shared/engineering/${path}`, import.meta.url), 'utf8')

it('reads purpose, model, range, source and example of each method out of the code', () => {
  const statements = methodStatements('interference-fit', file('interference-fit/holding-capacity.ts'))
  expect(statements.map((one) => one.name)).toEqual([
    'axialCapacity',
    'torqueCapacity',
    'slipSafety',
    'pressureForSafety',
  ])
  expect(statements[1]).toMatchObject({
    gives: 'Torque at which the seat slips round the shaft.',
    model: 'uniform pressure, T = μ_c p π D² L / 2.',
    source: 'shigley-9 Eq. 7-49',
  })
})

it('joins a model that runs over several lines and stops before the parameters', () => {
  const [statement] = methodStatements(
    'x',
    '/**\n * Gives.\n *\n * Model: one\n * two.\n * @param a [m] b\n *\n * Validity: v.\n * Source: s\n * Example: e\n */\nexport function f(a: number) {}',
  )
  expect(statement).toMatchObject({
    gives: 'Gives.',
    model: 'one two.',
    validity: 'v.',
    source: 's',
    example: 'e',
  })
})

it('leaves tools without a model out', () => {
  expect(methodStatements('x', '/** Adds. */\nexport function add() {}')).toEqual([])
})
