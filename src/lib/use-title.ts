import { useEffect } from 'react'
import { commonWords } from '../words/common-words.ts'

/** Names the page in the browser's tab and history. */
export function useTitle(title: string): void {
  useEffect(() => {
    document.title = title === '' ? commonWords.product : `${title} · ${commonWords.product}`
  }, [title])
}
