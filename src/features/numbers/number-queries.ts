import { queryOptions, useMutation, useQueryClient, type UseMutationResult } from '@tanstack/react-query'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { numberSheetEndpoints } from '../../../shared/api/number-sheet-endpoints.ts'
import { call, fileAddress } from '../../lib/api.ts'

export type NumberSheet = AnswerOf<typeof numberSheetEndpoints.numberSheet>
export type Measure = NumberSheet['items'][number]

export interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

export const numberSheetQuery = ({ team, set, number }: Place) =>
  queryOptions({
    queryKey: ['numbers', team, set, number],
    queryFn: ({ signal }) => call(numberSheetEndpoints.numberSheet, { params: { team, set, number }, signal }),
  })

export const numbersCsvAddress = (place: Place): string =>
  fileAddress(numberSheetEndpoints.numberSheetCsv, { params: place })

interface Tick {
  readonly keys: string[]
  readonly state: 'open' | 'ticked' | 'queried'
  readonly note?: string
}

const counted = (items: Measure[]): NumberSheet => ({
  items,
  ticked: items.filter(({ state }) => state === 'ticked').length,
  queried: items.filter(({ state }) => state === 'queried').length,
  open: items.filter(({ state }) => state === 'open' || state === 'changed').length,
})

/** Ticks at once and takes it back where the server refuses: unticking undoes it anyway. */
export function useTick(
  place: Place,
): UseMutationResult<NumberSheet, Error, Tick, { readonly before: NumberSheet | undefined }> {
  const client = useQueryClient()
  const { queryKey } = numberSheetQuery(place)
  return useMutation({
    mutationFn: (body: Tick) => call(numberSheetEndpoints.tick, { params: place, body }),
    onMutate: async ({ keys, state, note }) => {
      await client.cancelQueries({ queryKey })
      const before = client.getQueryData(queryKey)
      client.setQueryData(queryKey, (sheet) =>
        sheet === undefined
          ? sheet
          : counted(sheet.items.map((item) => (keys.includes(item.key) ? { ...item, state, note: note ?? '' } : item))),
      )
      return { before }
    },
    onError: (_error, _tick, context) => client.setQueryData(queryKey, context?.before),
    onSuccess: (sheet) => client.setQueryData(queryKey, sheet),
  })
}
