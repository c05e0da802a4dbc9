import { lookup, type LookupAddress, type LookupOptions } from 'node:dns'
import { isIP } from 'node:net'
import ipaddr from 'ipaddr.js'

/** Addresses that anybody on the internet has: neither ours, nor a neighbour's, nor a cloud's own services. */
export function isPublicAddress(address: string): boolean {
  try {
    return ipaddr.process(address).range() === 'unicast'
  } catch {
    return false
  }
}

export class PrivateAddressError extends Error {}

const refuse = (host: string): PrivateAddressError => new PrivateAddressError(`${host} is not a public address`)

type Answer = (error: NodeJS.ErrnoException | null, address: string | LookupAddress[], family?: number) => void

/**
 * Looks a host up for a connection and gives only public addresses: what was checked is what is connected to, so a
 * name that changes its address between the two gains nothing.
 */
export function lookupPublic(host: string, options: LookupOptions, done: Answer): void {
  lookup(host, { ...options, all: true }, (error, addresses) => {
    if (error !== null) {
      done(error, [])
      return
    }
    const isEveryPublic = addresses.length > 0 && addresses.every(({ address }) => isPublicAddress(address))
    if (!isEveryPublic) {
      done(refuse(host), [])
      return
    }
    const [first] = addresses
    if (options.all === true) done(null, addresses)
    else done(null, first?.address ?? '', first?.family)
  })
}

/** Refuses hosts written as private addresses, which are never looked up. @throws PrivateAddressError */
export function refusePrivateHost(url: URL): void {
  const host = url.hostname.replace(/^\[|\]$/g, '')
  if (isIP(host) !== 0 && !isPublicAddress(host)) throw refuse(host)
  if (host === 'localhost' || host.endsWith('.localhost')) throw refuse(host)
}
