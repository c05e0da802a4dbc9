/** Names of the dated postal rules that a set may ask for with `mail`. */
export const mailPackNames = [
  'usps-letter',
  'usps-flat',
  'usps-postcard',
  'usps-postcard-large',
  'royal-mail-letter',
  'royal-mail-large-letter',
  'canada-post-letter',
  'canada-post-oversize',
  'deutsche-post-standard',
  'deutsche-post-kompakt',
  'deutsche-post-gross',
  'deutsche-post-maxi',
  'upu-letter',
  'upu-standardized',
  'upu-small-letter',
  'upu-large-letter',
  'bpost-standard',
] as const

export type MailPackName = (typeof mailPackNames)[number]
