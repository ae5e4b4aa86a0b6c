import type { ReactNode } from 'react'

/** Read aloud, not shown. */
export const VisuallyHidden = ({ children }: { readonly children: ReactNode }) => (
  <span className="sr-only">{children}</span>
)
