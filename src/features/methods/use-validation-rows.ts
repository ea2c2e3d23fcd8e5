import { useEffect, useState } from 'react'
import type { ValidationReply, ValidationRow } from '@shared/validation/worker-messages'

export type ValidationRun =
  { state: 'running' } | { state: 'done'; rows: ValidationRow[] } | { state: 'failed'; message: string }

/** The checks run here, in this browser: the table shows what this very program computes. */
export function useValidationRows(): ValidationRun {
  const [run, setRun] = useState<ValidationRun>({ state: 'running' })
  useEffect(() => {
    const worker = new Worker(new URL('../../workers/validation-worker.ts', import.meta.url), {
      type: 'module',
    })
    worker.onmessage = ({ data }: MessageEvent<ValidationReply>) =>
      setRun(
        data.kind === 'rows'
          ? { state: 'done', rows: data.rows }
          : { state: 'failed', message: data.message },
      )
    worker.onerror = () => setRun({ state: 'failed', message: 'The checks could not be started.' })
    worker.postMessage('run')
    return () => worker.terminate()
  }, [])
  return run
}
