import { useQueryClient } from '@tanstack/react-query'
import { useEffect } from 'react'
import { meQuery } from '../features/session/session-queries.ts'
import { watchRefusals } from '../lib/api.ts'
import { watchSession } from '../lib/session-channel.ts'

/** Notices a session that ended here, in another tab or on the server, and forgets what it showed. */
export function SessionWatch(): null {
  const client = useQueryClient()
  useEffect(() => {
    const stop = watchRefusals(({ status, code }) => {
      if (status === 401 && code === 'signed-out' && client.getQueryData(meQuery.queryKey) != null)
        client.setQueryData(meQuery.queryKey, null)
    })
    const leave = watchSession(() => void client.invalidateQueries({ queryKey: meQuery.queryKey }))
    return () => {
      stop()
      leave()
    }
  }, [client])
  return null
}
