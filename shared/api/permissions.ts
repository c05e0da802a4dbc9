export const roles = ['owner', 'author', 'reviewer', 'tester', 'viewer'] as const
export type Role = (typeof roles)[number]

/** Everything somebody may be allowed to do in a team. */
export const actions = [
  'team:read',
  'team:manage',
  'team:export',
  'team:delete',
  'sets:read',
  'sets:edit',
  'push',
  'baseline:pin',
  'review:ask',
  'review:comment',
  'review:decide',
  'publish',
  'failures:accept',
  'numbers:tick',
  'builds:invite',
  'builds:read',
  'builds:submit',
  'papers:edit',
  'tokens:own',
  'tokens:manage',
  'webhooks:manage',
  'notices:choose',
  'audit:read',
  'retention:manage',
] as const
export type Action = (typeof actions)[number]

/** Choices of a team that widen what a role may do. */
export interface TeamChoices {
  /** Authors may publish, send errata and recall. */
  readonly authorsPublish: boolean
  /** An author's own approval is enough to publish. */
  readonly authorMayApproveAlone: boolean
  /** Approvals outlive changes that move no dimension and no fit. */
  readonly wordsKeepApproval: boolean
}

export const usualChoices: TeamChoices = {
  authorsPublish: false,
  authorMayApproveAlone: false,
  wordsKeepApproval: false,
}

type Allowance = 'yes' | 'no' | keyof TeamChoices

const everyone = { owner: 'yes', author: 'yes', reviewer: 'yes', tester: 'yes', viewer: 'yes' } as const
const readers = { ...everyone, tester: 'no' } as const
const makers = { owner: 'yes', author: 'yes', reviewer: 'no', tester: 'no', viewer: 'no' } as const
const judges = { owner: 'yes', author: 'yes', reviewer: 'yes', tester: 'no', viewer: 'no' } as const
const owners = { owner: 'yes', author: 'no', reviewer: 'no', tester: 'no', viewer: 'no' } as const

/** Roles × actions. Testers see only the versions they are invited to build, through their invitations. */
export const permissions: Readonly<Record<Action, Readonly<Record<Role, Allowance>>>> = {
  'team:read': readers,
  'team:manage': owners,
  'team:export': owners,
  'team:delete': owners,
  'sets:read': readers,
  'sets:edit': makers,
  push: makers,
  'baseline:pin': makers,
  'review:ask': makers,
  'review:comment': judges,
  'review:decide': judges,
  publish: { ...owners, author: 'authorsPublish' },
  'failures:accept': { owner: 'yes', author: 'no', reviewer: 'yes', tester: 'no', viewer: 'no' },
  'numbers:tick': judges,
  'builds:invite': makers,
  'builds:read': judges,
  'builds:submit': { ...everyone, viewer: 'no' },
  'papers:edit': judges,
  'tokens:own': makers,
  'tokens:manage': owners,
  'webhooks:manage': owners,
  'notices:choose': everyone,
  'audit:read': owners,
  'retention:manage': owners,
}

/** Whether a role may do an action under a team's choices; the same answer on the server and the page. */
export function may(role: Role, action: Action, choices: TeamChoices): boolean {
  const allowance = permissions[action][role]
  if (allowance === 'yes') return true
  return allowance === 'no' ? false : choices[allowance]
}
