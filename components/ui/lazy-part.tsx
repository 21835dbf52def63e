import { Component, Suspense, type ReactNode } from 'react'
import { Platform } from 'react-native'

import { ErrorState } from './error-state'
import { SkeletonRows } from './skeleton'

interface Props {
  /** What is loading, for readers: "Loading the sign-in form". */
  label: string
  children: ReactNode
  fallback?: ReactNode
}

/** Around what is loaded on demand: a place kept while it comes, and a way on when it does not come. */
export class LazyPart extends Component<Props, { hasFailed: boolean }> {
  override state = { hasFailed: false }

  static getDerivedStateFromError() {
    return { hasFailed: true }
  }

  // A chunk that failed stays failed for this page load, so on the web only loading the page again helps.
  tryAgain = () => {
    if (Platform.OS === 'web') window.location.reload()
    else this.setState({ hasFailed: false })
  }

  override render() {
    const { label, children, fallback } = this.props
    if (this.state.hasFailed) {
      return (
        <ErrorState
          title="This part did not load"
          body="The connection may be gone, or we put out a newer version. Nothing you sent is lost."
          onRetry={this.tryAgain}
        />
      )
    }
    return <Suspense fallback={fallback ?? <SkeletonRows label={label} rows={2} />}>{children}</Suspense>
  }
}
