import { useEffect, useState } from 'react'
import { requestDerivation } from '@/stores/recalculation'
import { useResultsStore } from '@/stores/results-store'
import type { Derivation, QuantityReference } from '@shared/recalculation/derivation'

export interface DerivationState {
  reference: QuantityReference
  derivation: Derivation | null
  failure: string | null
}

/** How one number came about, again whenever the results change. A late answer to another question is dropped. */
export function useDerivation(reference: QuantityReference | undefined): DerivationState | null {
  const document = useResultsStore((state) => state.document)
  const [answer, setAnswer] = useState<DerivationState | null>(null)

  useEffect(() => {
    if (reference === undefined) return
    let isCurrent = true
    requestDerivation(reference).then(
      (derivation) => isCurrent && setAnswer({ reference, derivation, failure: null }),
      (error: unknown) =>
        isCurrent &&
        setAnswer({
          reference,
          derivation: null,
          failure: error instanceof Error ? error.message : String(error),
        }),
    )
    return () => {
      isCurrent = false
    }
  }, [reference, document])

  return answer?.reference === reference ? answer : null
}
