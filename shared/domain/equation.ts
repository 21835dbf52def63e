import type { SourceKey } from '@/shared/sources'

/** An equation as a page shows it: the line itself, where it holds, and who published it. */
export interface Equation {
  text: string
  validFor: string
  sourceKeys: readonly SourceKey[]
}
