import { useCallback } from 'react'
import { useSearchParams } from 'react-router-dom'

export interface AddressFilter {
  value(name: string): string
  /** Sets several at once; an empty value leaves the address. */
  choose(values: Readonly<Record<string, string>>): void
}

/** Filters that live in the address, so that a list can be linked to and gone back to. */
export function useAddressFilter(): AddressFilter {
  const [params, setParams] = useSearchParams()
  const choose = useCallback(
    (values: Readonly<Record<string, string>>) => {
      setParams(
        (before) => {
          const next = new URLSearchParams(before)
          for (const [name, value] of Object.entries(values)) {
            if (value === '') next.delete(name)
            else next.set(name, value)
          }
          return next
        },
        { replace: true },
      )
    },
    [setParams],
  )
  return { value: (name) => params.get(name) ?? '', choose }
}
