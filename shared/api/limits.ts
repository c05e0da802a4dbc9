/** Limits of what is accepted, in characters, bytes or pieces; part of the contract. */
export const limits = {
  name: 120,
  title: 300,
  email: 254,
  password: { min: 10, max: 200 },
  note: 4_000,
  comment: 10_000,
  reason: 1_000,
  link: 2_000,
  branch: 250,
  ancestors: 500,
  tag: 40,
  tags: 20,
  licence: 20_000,
  search: 100,
  setText: 262_144,
  workspaceText: 262_144,
  setsPerPush: 200,
  readingsPerDimension: 3,
  dimensionsPerBuild: 200,
  problemsPerBuild: 50,
  photosPerBuild: 12,
  rowsPerImport: 2_000,
  paperReadings: 20,
  page: { usual: 50, max: 200 },
} as const

/** Largest bodies in bytes. */
export const bodyLimits = {
  usual: 128 * 1024,
  push: 12 * 1024 * 1024,
  photo: 15 * 1024 * 1024,
  csv: 2 * 1024 * 1024,
} as const
