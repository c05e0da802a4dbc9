const part = encodeURIComponent

/** Addresses of pages; the server's mails and notices use the same. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  reset: '/password',
  account: '/account',
  myBuilds: '/builds',
  sets: (team: string) => `/teams/${team}/sets`,
  holds: (team: string) => `/teams/${team}/holds`,
  upload: (team: string) => `/teams/${team}/upload`,
  tryIt: (team: string) => `/teams/${team}/try`,
  set: (team: string, set: string) => `/teams/${team}/sets/${part(set)}`,
  version: (team: string, set: string, number: number) => `/teams/${team}/sets/${part(set)}/versions/${String(number)}`,
  compare: (team: string, set: string, number: number, other?: number) =>
    `/teams/${team}/sets/${part(set)}/versions/${String(number)}/compare${other === undefined ? '' : `?with=${String(other)}`}`,
  numbers: (team: string, set: string, number: number) =>
    `/teams/${team}/sets/${part(set)}/versions/${String(number)}/numbers`,
  builds: (team: string, set: string, number: number) =>
    `/teams/${team}/sets/${part(set)}/versions/${String(number)}/builds`,
  tryVersion: (team: string, set: string, number: number) =>
    `/teams/${team}/try?set=${part(set)}&version=${String(number)}`,
  review: (team: string, set: string, number: number) =>
    `/teams/${team}/sets/${part(set)}/versions/${String(number)}/review`,
  team: (team: string) => `/teams/${team}/team`,
  testForm: (key: string) => `/test/${part(key)}`,
} as const
