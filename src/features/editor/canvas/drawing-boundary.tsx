/** Errors while drawing cannot reach a boundary outside the konva stage; this one stands inside and tells the page. */
import { Component, type ReactNode } from 'react'

interface Props {
  onError: (message: string) => void
  children: ReactNode
}

export class DrawingBoundary extends Component<Props, { hasFailed: boolean }> {
  override state = { hasFailed: false }

  static getDerivedStateFromError() {
    return { hasFailed: true }
  }

  override componentDidCatch() {
    this.props.onError(
      'The drawing could not be shown. The outline and the tables still work; reload to draw it again.',
    )
  }

  override render() {
    return this.state.hasFailed ? null : this.props.children
  }
}
