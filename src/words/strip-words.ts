/** Words of the hundred builds. */
export const stripWords = {
  sentence: (binds: number, goes: number, rattles: number) =>
    `Of a hundred builds ${String(goes)} go` +
    (binds > 0 ? `, ${String(binds)} bind` : '') +
    (rattles > 0 ? `, ${String(rattles)} rattle` : ''),
  binds: 'binds',
  goes: 'goes',
  rattles: 'rattles',
} as const
