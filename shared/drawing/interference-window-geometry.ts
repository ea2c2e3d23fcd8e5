/**
 * The interference window as plain numbers and words, for the screen (SVG) and for the printed
 * sheets (PDF) alike. The axis is as-made diametral interference in micrometres: the left mark is the
 * least that still holds, the right mark the most the parts stand, the bar the band the tolerances
 * can produce. Types only from elsewhere; drawing it is the caller's.
 */
import type { HubResult } from '../recalculation/layout-results'

export interface WindowValues {
  /** Band of the tolerances, as made. */
  minUm: number | null
  maxUm: number | null
  /** Least interference that holds; null when it cannot be computed. */
  requiredUm: number | null
  requiredCause: string
  /** Most interference the parts stand. */
  permissibleUm: number | null
  permissibleCause: string
  isEmpty: boolean
}

/** `slips`: the loosest pair is below the window; `yields`: the tightest is above it. */
export type WindowState = 'inside' | 'slips' | 'yields' | 'slipsAndYields' | 'empty' | 'unknown'

export interface WindowScale {
  fromUm: number
  toUm: number
  ticksUm: number[]
}

export interface Span {
  from: number
  to: number
}

export interface WindowGeometry {
  state: WindowState
  /** Zones left and right of the window; where the window is empty both reach over the gap. */
  slipZone: Span | null
  window: Span | null
  yieldZone: Span | null
  /** From permissible to required when the window is empty. */
  gap: Span | null
  bar: Span | null
  /** Parts of the bar outside the window, each to be drawn with a pattern as well as a colour. */
  barBelow: Span | null
  barAbove: Span | null
  requiredMark: number | null
  permissibleMark: number | null
  zeroMark: number | null
}

export function windowValuesOf(hub: HubResult): WindowValues {
  return {
    minUm: hub.interference.minUm,
    maxUm: hub.interference.maxUm,
    requiredUm: hub.window.requiredUm,
    requiredCause: hub.window.requiredCause,
    permissibleUm: hub.window.permissibleUm,
    permissibleCause: hub.window.permissibleCause,
    isEmpty: hub.window.isEmpty,
  }
}

export function windowState(values: WindowValues): WindowState {
  if (values.isEmpty) return 'empty'
  const { minUm, maxUm, requiredUm, permissibleUm } = values
  if (minUm === null || maxUm === null || (requiredUm === null && permissibleUm === null)) return 'unknown'
  const slips = requiredUm !== null && minUm < requiredUm
  const yields = permissibleUm !== null && maxUm > permissibleUm
  if (slips && yields) return 'slipsAndYields'
  if (slips) return 'slips'
  return yields ? 'yields' : 'inside'
}

/** What happens beyond a mark, in a word or two: "slips" below, "yields" or "overheats" above. */
export function belowWord({ requiredCause }: Pick<WindowValues, 'requiredCause'>): string {
  return /(slips|comes loose) below/.exec(requiredCause)?.[1] ?? 'loose'
}

export function aboveWord({ permissibleCause }: Pick<WindowValues, 'permissibleCause'>): string {
  return /(yields|cracks|overheats|cannot be joined) above/.exec(permissibleCause)?.[1] ?? 'too tight'
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1)

/** The status of a hub's window in words. */
export function windowStateWords(values: WindowValues): string {
  switch (windowState(values)) {
    case 'inside':
      return 'Inside window'
    case 'slips':
      return capital(belowWord(values))
    case 'yields':
      return capital(aboveWord(values))
    case 'slipsAndYields':
      return `${capital(belowWord(values))} and ${aboveWord(values)}`
    case 'empty':
      return 'Window is empty'
    case 'unknown':
      return 'Not computed'
  }
}

/** A sign beside the word, so that state is not colour alone and survives black-and-white print. */
export const WINDOW_STATE_SIGNS: Record<WindowState, string> = {
  inside: '✓',
  slips: '◀',
  yields: '▶',
  slipsAndYields: '◀▶',
  empty: '✕',
  unknown: '?',
}

/** Room beyond the outermost mark, as a share of the span, so that no mark sits on the edge. */
const MARGIN_SHARE = 0.12

/**
 * A scale wide enough for every window given. One window: its own scale (inspector, sheet of one
 * hub). All hubs of a layout: the common scale of the schedule. Starts at zero unless something
 * lies below it. `unitUm` is the unit of the axis (25.4 for thousandths of an inch), so that its ticks
 * fall on round numbers.
 */
export function windowScale(windows: readonly WindowValues[], unitUm = 1): WindowScale {
  let least = 0
  let most = 0
  for (const { minUm, maxUm, requiredUm, permissibleUm } of windows) {
    for (const value of [minUm, maxUm, requiredUm, permissibleUm]) {
      if (value === null || !Number.isFinite(value)) continue
      least = Math.min(least, value / unitUm)
      most = Math.max(most, value / unitUm)
    }
  }
  if ((most - least) * unitUm < LEAST_SPAN_UM) most = least + LEAST_SPAN_UM / unitUm
  const step = tickStep(most - least)
  const margin = (most - least) * MARGIN_SHARE
  const first = least < 0 ? Math.floor((least - margin) / step) : 0
  const last = Math.ceil((most + margin) / step)
  const tick = (count: number) => Number((count * step * unitUm).toPrecision(10))
  return {
    fromUm: tick(first),
    toUm: tick(last),
    ticksUm: Array.from({ length: last - first + 1 }, (_, index) => tick(first + index)),
  }
}

const LEAST_SPAN_UM = 10

/** Four to eight ticks at 1, 2, 2.5 or 5 times a power of ten. */
function tickStep(span: number): number {
  const rough = span / 5
  const power = 10 ** Math.floor(Math.log10(rough))
  return ([1, 2, 2.5, 5].find((factor) => factor * power >= rough) ?? 10) * power
}

/** Where everything lies over `width` units of drawing. Positions are clamped to the drawing. */
export function windowGeometry(values: WindowValues, scale: WindowScale, width: number): WindowGeometry {
  const span = scale.toUm - scale.fromUm
  const at = (um: number) => Math.min(width, Math.max(0, ((um - scale.fromUm) * width) / span))
  const { minUm, maxUm, requiredUm, permissibleUm } = values
  const state = windowState(values)
  const required = requiredUm === null ? null : at(requiredUm)
  const permissible = permissibleUm === null ? null : at(permissibleUm)
  const bar = minUm === null || maxUm === null ? null : spanOf(at(minUm), at(maxUm))
  const isEmpty = state === 'empty'
  const hasMark = required !== null || permissible !== null
  return {
    state,
    slipZone: required === null ? null : spanOf(0, required),
    window: isEmpty || !hasMark ? null : spanOf(required ?? 0, permissible ?? width),
    yieldZone: permissible === null ? null : spanOf(permissible, width),
    gap: isEmpty && required !== null && permissible !== null ? spanOf(permissible, required) : null,
    bar,
    barBelow:
      bar !== null && required !== null && bar.from < required
        ? spanOf(bar.from, Math.min(bar.to, required))
        : null,
    barAbove:
      bar !== null && permissible !== null && bar.to > permissible
        ? spanOf(Math.max(bar.from, permissible), bar.to)
        : null,
    requiredMark: required,
    permissibleMark: permissible,
    zeroMark: scale.fromUm < 0 ? at(0) : null,
  }
}

const spanOf = (from: number, to: number): Span => ({ from: Math.min(from, to), to: Math.max(from, to) })

const um = (value: number) => `${Math.round(value)} µm`

/** One sentence that says what the drawing shows. */
export function windowSentence(values: WindowValues): string {
  const { minUm, maxUm, requiredUm, permissibleUm, requiredCause, permissibleCause } = values
  const band =
    minUm === null || maxUm === null
      ? 'The band of the tolerances is not computed.'
      : `Made with ${Math.round(minUm)} to ${um(maxUm)} of interference.`
  const cause = (text: string) => (text === '' ? '' : ` – ${text} –`)
  const least = requiredUm === null ? '' : `needs at least ${um(requiredUm)}${cause(requiredCause)}`
  const most = permissibleUm === null ? '' : `may have at most ${um(permissibleUm)}${cause(permissibleCause)}`
  const limits = [least, most].filter((text) => text !== '')
  const sentence = limits.length === 0 ? 'Its limits are not computed' : `It ${limits.join(' and ')}`
  return `${windowStateWords(values)}. ${band} ${sentence}.`
}

export interface PlacedLabel {
  /** Middle of the text. */
  at: number
  row: number
}

/**
 * Keeps labels inside the drawing and off each other: a label that would touch the one before it
 * goes to the next row. `width` of a label and of the drawing in the same unit.
 */
export function placeLabels(labels: readonly { at: number; width: number }[], width: number): PlacedLabel[] {
  const rowEnds: number[] = []
  return labels.map((label) => {
    const at = Math.min(
      Math.max(label.at, label.width / 2),
      Math.max(width - label.width / 2, label.width / 2),
    )
    let row = 0
    while (row < rowEnds.length && at - label.width / 2 < (rowEnds[row] ?? 0)) row += 1
    rowEnds[row] = at + label.width / 2
    return { at, row }
  })
}
