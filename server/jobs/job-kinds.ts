/** What each kind of job works on. Nothing secret: jobs lie in the database. */
export interface JobData {
  readonly 'compare-version': { readonly versionId: string }
  readonly ripple: { readonly pushId: string }
  readonly 'render-exports': { readonly publicationId: string }
  readonly 'send-mail': { readonly to: string; readonly subject: string; readonly text: string }
  /** The secret of the link is made when it is mailed, and stored as a digest only. */
  readonly 'mail-link': { readonly link: 'invitation' | 'account' | 'build'; readonly id: string }
  readonly 'deliver-webhook': { readonly deliveryId: string }
  readonly 'send-digests': object
  readonly upkeep: object
}

export type JobKind = keyof JobData

/** With every job: whose it is and a few words, for the list of failed work. */
export interface JobLabel {
  readonly kind: JobKind
  readonly teamId: string | null
  readonly about: string
}

interface JobSettings {
  readonly retryLimit: number
  /** Seconds before the first retry; doubled each time. */
  readonly retryDelay: number
  readonly expireInSeconds: number
  /** Cron in UTC, for jobs that start by themselves. */
  readonly every: string | null
}

const usual: JobSettings = { retryLimit: 4, retryDelay: 2, expireInSeconds: 300, every: null }

export const jobKinds: Readonly<Record<JobKind, JobSettings>> = {
  'compare-version': usual,
  ripple: { ...usual, expireInSeconds: 1_800 },
  'render-exports': usual,
  'send-mail': { ...usual, retryLimit: 8, retryDelay: 15 },
  'mail-link': { ...usual, retryLimit: 8, retryDelay: 15 },
  'deliver-webhook': { ...usual, retryLimit: 6, retryDelay: 20, expireInSeconds: 60 },
  'send-digests': { ...usual, every: '5 * * * *' },
  upkeep: { ...usual, expireInSeconds: 3_000, every: '20 3 * * *' },
}

export const deadLetter = 'failed-work'
