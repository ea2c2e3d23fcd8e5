import { Banner } from './banner'
import { Button } from './button'

/** In place of content that could not be fetched. */
export function LoadFailure({
  message,
  isRetrying,
  onRetry,
}: {
  message: string
  isRetrying: boolean
  onRetry: () => void
}) {
  return (
    <Banner
      tone="bad"
      action={
        <Button size="sm" isBusy={isRetrying} onClick={onRetry}>
          Try again
        </Button>
      }
    >
      {message}
    </Banner>
  )
}
