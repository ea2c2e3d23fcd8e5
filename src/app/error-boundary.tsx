import { Component, type ReactNode } from 'react'
import { Button } from '@/components/button'

interface Props {
  /** A change of key gives the page another chance, as after navigation. */
  resetKey?: string
  children: ReactNode
}

/** What a page shows when it breaks: calm words and a way on, never a stack trace. */
export class ErrorBoundary extends Component<Props, { error: unknown }> {
  override state = { error: null as unknown }

  static getDerivedStateFromError(error: unknown) {
    return { error }
  }

  override componentDidUpdate(previous: Props) {
    if (previous.resetKey !== this.props.resetKey && this.state.error) this.setState({ error: null })
  }

  override render() {
    if (!this.state.error) return this.props.children
    return (
      <main className="mx-auto grid max-w-lg gap-4 px-6 py-20">
        <h1 className="text-2xl font-bold">This page stopped working</h1>
        <p className="text-quiet">
          The fault is on our side. Edits already shown as saved are on the server, and edits still waiting
          are kept in this browser. Reloading usually helps, also after an update of Hubstead.
        </p>
        <div className="flex gap-3">
          <Button variant="primary" onClick={() => location.reload()}>
            Reload the page
          </Button>
          <Button onClick={() => location.assign('/')}>Go to the layouts</Button>
        </div>
      </main>
    )
  }
}
