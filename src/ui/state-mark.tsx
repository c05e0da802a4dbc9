import type { JSX } from 'react'
import { stateWords } from '../words/state-words.ts'

export type StateName = keyof typeof stateWords

type Tone = 'pass' | 'warn' | 'fail' | 'info' | 'waived' | 'soft'

/** Shapes differ even in black and white: a tick, a wedge, a cross in a square, a ring, a slash, dots. */
const shapes: Readonly<Record<string, JSX.Element>> = {
  tick: <path d="M2.5 8.5 6.5 12.5 13.5 3.5" fill="none" strokeWidth="2.4" />,
  wedge: (
    <>
      <path d="M8 2 15 14H1Z" fill="none" strokeWidth="1.7" strokeLinejoin="miter" />
      <path d="M8 6.5v3.6M8 11.4v1.2" strokeWidth="1.7" />
    </>
  ),
  cross: (
    <>
      <rect x="1" y="1" width="14" height="14" fill="currentColor" stroke="none" />
      <path d="m4.5 4.5 7 7m0-7-7 7" stroke="var(--sheet)" strokeWidth="2" />
    </>
  ),
  ring: <circle cx="8" cy="8" r="5.6" fill="none" strokeWidth="1.8" strokeDasharray="2.4 2" />,
  slash: (
    <>
      <circle cx="8" cy="8" r="6.2" fill="none" strokeWidth="1.6" />
      <path d="M3.6 12.4 12.4 3.6" strokeWidth="1.6" />
    </>
  ),
  dot: (
    <>
      <circle cx="8" cy="8" r="6.4" fill="none" strokeWidth="1.5" />
      <path d="M8 7v4.6M8 4.2v1.4" strokeWidth="1.8" />
    </>
  ),
  down: <path d="M8 2v11M3.5 8.5 8 13l4.5-4.5" fill="none" strokeWidth="2" />,
  up: <path d="M8 14V3M3.5 7.5 8 3l4.5 4.5" fill="none" strokeWidth="2" />,
  same: <path d="M2 6h12M2 10.5h12" strokeWidth="1.8" />,
  clock: <path d="M8 1.8a6.2 6.2 0 1 1 0 12.4A6.2 6.2 0 0 1 8 1.8ZM8 4.5V8l2.6 1.8" fill="none" strokeWidth="1.6" />,
}

const looks: Readonly<Record<StateName, readonly [shape: string, tone: Tone]>> = {
  pass: ['tick', 'pass'],
  warn: ['wedge', 'warn'],
  fail: ['cross', 'fail'],
  info: ['dot', 'info'],
  waived: ['slash', 'waived'],
  unchecked: ['ring', 'soft'],
  crashed: ['cross', 'fail'],
  invalid: ['cross', 'fail'],
  'newly-failing': ['cross', 'fail'],
  failing: ['cross', 'fail'],
  'known-failing': ['slash', 'waived'],
  warning: ['wedge', 'warn'],
  passing: ['tick', 'pass'],
  worse: ['down', 'fail'],
  better: ['up', 'pass'],
  same: ['same', 'soft'],
  changed: ['same', 'info'],
  first: ['dot', 'info'],
  pending: ['clock', 'soft'],
  incomparable: ['ring', 'soft'],
  none: ['ring', 'soft'],
  asked: ['clock', 'info'],
  approved: ['tick', 'pass'],
  'changes-asked': ['wedge', 'warn'],
  stale: ['clock', 'warn'],
  published: ['tick', 'pass'],
  recalled: ['slash', 'fail'],
  ticked: ['tick', 'pass'],
  queried: ['wedge', 'warn'],
  open: ['ring', 'soft'],
  moved: ['clock', 'fail'],
  active: ['tick', 'pass'],
  ended: ['slash', 'soft'],
  lapsed: ['clock', 'fail'],
  'lapses-soon': ['clock', 'warn'],
  mended: ['tick', 'pass'],
}

const colours: Readonly<Record<Tone, string>> = {
  pass: 'text-pass',
  warn: 'text-warn',
  fail: 'text-fail',
  info: 'text-info',
  waived: 'text-waived',
  soft: 'text-soft',
}

/** A state as a shape and its word; colour comes last. */
export function StateMark({
  state,
  isLarge = false,
  children,
}: {
  readonly state: StateName
  readonly isLarge?: boolean
  /** Said instead of the usual word. */
  readonly children?: string | undefined
}): JSX.Element {
  const [shape, tone] = looks[state]
  return (
    <span
      className={`inline-flex items-center gap-1.5 font-semibold ${colours[tone]} ${isLarge ? 'text-lg' : 'text-sm'}`}
    >
      <svg
        viewBox="0 0 16 16"
        className={isLarge ? 'size-5 shrink-0' : 'size-3.5 shrink-0'}
        stroke="currentColor"
        aria-hidden="true"
      >
        {shapes[shape]}
      </svg>
      <span>{children ?? stateWords[state]}</span>
    </span>
  )
}
