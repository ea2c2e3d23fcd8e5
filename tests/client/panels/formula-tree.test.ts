import { describe, expect, it } from 'vitest'
import { type FormulaNode, parseFormula } from '@/features/results/formula-tree'

/** The tree in one line: fractions as [above÷below], subscripts as _{}, powers as ^{}, roots as √[]. */
function show(node: FormulaNode): string {
  switch (node.kind) {
    case 'text':
      return node.text
    case 'row':
      return node.items.map(show).join('')
    case 'fraction':
      return `[${show(node.above)}÷${show(node.below)}]`
    case 'root':
      return `√[${show(node.content)}]`
    case 'group':
      return `(${show(node.content)})`
    case 'scripted':
      return (
        show(node.base) +
        (node.sub === null ? '' : `_{${show(node.sub)}}`) +
        (node.sup === null ? '' : `^{${show(node.sup)}}`)
      )
  }
}

const read = (text: string) => show(parseFormula(text))

describe('formulas as the calculation writes them', () => {
  it.each([
    ['p = d_eff / (D (K_A + K_I))', 'p = [d_{eff}÷D (K_{A} + K_{I})]'],
    ['σ_v = p √(3 + Q_A^4) / (1 − Q_A^2)', 'σ_{v} = [p √[3 + Q_{A}^{4}]÷1 − Q_{A}^{2}]'],
    ['u_A = ρ_A ω^2 a/(4 E_A) (b^2)', 'u_{A} = [ρ_{A} ω^{2} a÷4 E_{A}] (b^{2})'],
    ['a = D/2,  b = D_a/2', 'a = [D÷2],  b = [D_{a}÷2]'],
    ['d_eff = d_min − Δd_e + Δd_T', 'd_{eff} = d_{min} − Δd_{e} + Δd_{T}'],
    ['E I z″ = −M_y', 'E I z″ = −M_{y}'],
    ['T_slip = μ_c p π D^2 L / 2', 'T_{slip} = [μ_{c} p π D^{2} L÷2]'],
    ['S √((K F/μ_a)^2 + (2 K T/(D μ_c))^2)', 'S √[([K F÷μ_{a}])^{2} + ([2 K T÷D μ_{c}])^{2}]'],
    ['K_f = 2.7 (R_m/1000 MPa)^0.43', 'K_{f} = 2.7 ([R_{m}÷1000 MPa])^{0.43}'],
    ['α (t_I − 20 °C)', 'α (t_{I} − 20 °C)'],
  ])('%s', (formula, tree) => {
    expect(read(formula)).toBe(tree)
  })

  it('keeps every letter of what it cannot typeset', () => {
    const odd = 'p = 0 when |x| > 3 {y} ) (open'
    const letters = (text: string) => text.replace(/[^\p{L}\p{N}]/gu, '')
    expect(letters(read(odd))).toBe(letters(odd))
  })
})
