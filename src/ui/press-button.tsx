import type { JSX, ReactNode } from 'react'
import { Button } from 'react-aria-components'

/** A button for parts that pass presses through context. */
export function PressButton({ children }: { readonly children: ReactNode }): JSX.Element {
  return <Button className="button">{children}</Button>
}
