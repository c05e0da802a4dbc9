/** A hundred builds as counts: how many bind, go and rattle. Never rounds some to none. */
export interface HundredBuilds {
  readonly binds: number
  readonly goes: number
  readonly rattles: number
}

const count = (share: number): number => (share <= 0.0005 ? 0 : Math.max(1, Math.round(share * 100)))

/** Shares of builds that bind and rattle as whole builds out of a hundred; the rest go. */
export function hundredBuilds(binds: number, rattles: number): HundredBuilds {
  const bind = Math.min(100, count(binds))
  const rattle = Math.min(100 - bind, count(rattles))
  return { binds: bind, goes: 100 - bind - rattle, rattles: rattle }
}
