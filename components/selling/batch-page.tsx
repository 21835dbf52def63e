import type { ReactNode } from 'react'

import { Page } from '@/components/layout/page'

/** The page of the batch form before the form itself is there. */
export function BatchPage({ children }: { children: ReactNode }) {
  return (
    <Page title="List a batch" width="readable" back={{ label: 'Back to selling', href: '/sell' }}>
      {children}
    </Page>
  )
}
