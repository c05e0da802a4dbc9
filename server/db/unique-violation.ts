/** True where a write failed because a unique index of this name holds the value already. */
export function isUniqueViolation(error: unknown, index: string): boolean {
  const inner = (error as { readonly driverError?: { readonly code?: unknown; readonly constraint?: unknown } } | null)
    ?.driverError
  return inner?.code === '23505' && inner.constraint === index
}
