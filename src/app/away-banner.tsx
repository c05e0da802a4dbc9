import { useQueryClient } from '@tanstack/react-query'
import { useEffect, useState, type JSX } from 'react'
import { watchRefusals } from '../lib/api.ts'
import { commonWords } from '../words/common-words.ts'

type Reach = 'reached' | 'away' | 'back'

const isAway = (status: number): boolean => status === 0 || status === 502 || status === 503 || status === 504

/** Says that the server is away, asks for it every few seconds, and has everything loaded again once it answers. */
export function AwayBanner(): JSX.Element {
  const client = useQueryClient()
  const [reach, setReach] = useState<Reach>('reached')
  useEffect(() => watchRefusals(({ status }) => (isAway(status) ? setReach('away') : undefined)), [])
  useEffect(() => {
    if (reach === 'reached') return undefined
    if (reach === 'back') {
      const timer = setTimeout(() => setReach('reached'), 6_000)
      return () => clearTimeout(timer)
    }
    const timer = setInterval(() => {
      fetch('/api/health/ready')
        .then((answer) => {
          if (!answer.ok) return
          setReach('back')
          void client.invalidateQueries()
        })
        .catch(() => undefined)
    }, 2_000)
    return () => clearInterval(timer)
  }, [reach, client])
  return (
    <div role="status" aria-live="polite" className="no-print sticky top-0 z-30">
      {reach === 'away' ? (
        <p className="border-b-2 border-warn bg-warn-wash px-4 py-2 text-sm font-semibold">{commonWords.away}</p>
      ) : null}
      {reach === 'back' ? (
        <p className="border-b-2 border-pass bg-pass-wash px-4 py-2 text-sm font-semibold">{commonWords.back}</p>
      ) : null}
    </div>
  )
}
