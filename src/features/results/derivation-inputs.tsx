import { formatNumber } from '@/lib/format-quantity'
import { useDerivationStore } from '@/stores/derivation-store'
import type { DerivationInput } from '@shared/recalculation/derivation'
import { Formula } from './formula'

/** Symbol, what it is, value, and where the value comes from; calculated inputs open in turn. */
export function DerivationInputs({ inputs }: { inputs: readonly DerivationInput[] }) {
  const follow = useDerivationStore((state) => state.follow)
  if (inputs.length === 0) return null
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-collapse">
        <thead>
          <tr className="text-left text-xs text-quiet">
            <th scope="col" className="border-b border-hairline py-1 pr-3 font-semibold">
              Symbol
            </th>
            <th scope="col" className="border-b border-hairline py-1 pr-3 font-semibold">
              Quantity
            </th>
            <th scope="col" className="border-b border-hairline py-1 pr-3 text-right font-semibold">
              Value
            </th>
            <th scope="col" className="border-b border-hairline py-1 font-semibold">
              From
            </th>
          </tr>
        </thead>
        <tbody>
          {inputs.map(({ symbol, name, value, unit, origin, opens }, index) => (
            <tr key={index}>
              <td className="border-b border-hairline py-1.5 pr-3">
                <Formula text={symbol} />
              </td>
              <td className="border-b border-hairline py-1.5 pr-3">{name}</td>
              <td className="border-b border-hairline py-1.5 pr-3 text-right font-semibold whitespace-nowrap tabular-nums">
                {typeof value === 'number' ? formatNumber(value, inputDecimals(value)) : value}
                {unit !== '' && ` ${unit}`}
              </td>
              <td className="border-b border-hairline py-1.5 text-quiet">
                {opens === undefined ? (
                  origin
                ) : (
                  <button
                    type="button"
                    className="font-semibold text-steel underline decoration-dotted underline-offset-4"
                    onClick={() => follow(opens)}
                  >
                    {origin ?? 'calculated'}
                    <span className="sr-only">, open the formula of {name}</span>
                  </button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

/** Entered values in full, calculated ones to about four digits. */
function inputDecimals(value: number): number {
  const written = (String(value).split('.')[1] ?? '').length
  const size = Math.abs(value)
  const fourDigits = size === 0 ? 0 : Math.max(0, 3 - Math.floor(Math.log10(size)))
  return Math.min(written, Math.max(fourDigits, size >= 1000 ? 0 : 1), 10)
}
