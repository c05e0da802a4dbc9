/** `1 fit`, `2 fits`. */
export const plural = (count: number, one: string, many: string): string =>
  `${count.toLocaleString()} ${count === 1 ? one : many}`
