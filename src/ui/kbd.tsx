import type { ReactNode } from 'react';

/** A key. */
export function Kbd({ children }: { children: ReactNode }) {
  return <kbd>{children}</kbd>;
}
