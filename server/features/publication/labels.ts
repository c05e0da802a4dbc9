/** Three numbers, as in 1.2.0. */
export type Label = readonly [major: number, minor: number, patch: number]

export function readLabel(text: string): Label {
  const [major = 0, minor = 0, patch = 0] = text.split('.').map(Number)
  return [major, minor, patch]
}

export const compareLabels = (a: string, b: string): number => {
  const [x, y] = [readLabel(a), readLabel(b)]
  return x[0] - y[0] || x[1] - y[1] || x[2] - y[2]
}

/** The label after another: major where old and new pieces no longer mate, minor for sizes, patch for words. */
export function nextLabel(label: string, step: 'major' | 'minor' | 'patch' | 'none'): string {
  const [major, minor, patch] = readLabel(label)
  if (step === 'major') return `${String(major + 1)}.0.0`
  if (step === 'minor') return `${String(major)}.${String(minor + 1)}.0`
  return `${String(major)}.${String(minor)}.${String(patch + 1)}`
}
