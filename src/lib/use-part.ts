import { useParams } from 'react-router-dom'

/** A part of the address that the router has matched. */
export function usePart(name: string): string {
  return useParams()[name] ?? ''
}
