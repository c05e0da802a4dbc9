const reasons: Readonly<Record<string, string>> = {
  EACCES: 'you may not write there',
  EPERM: 'you may not write there',
  EROFS: 'the folder is read-only',
  ENOSPC: 'the disk is full',
  EDQUOT: 'your share of the disk is used up',
  EISDIR: 'there is a folder of that name',
  EEXIST: 'there is a file where a folder is needed',
  ENOTDIR: 'a part of the path is a file',
  ENAMETOOLONG: 'the name is too long',
  EBADF: 'it is closed',
}

/** Why something was not written, in words; the system's own code where there are none for it. */
export function reasonOf(error: unknown): string {
  const { code = '' } = error as NodeJS.ErrnoException
  return reasons[code] ?? (code === '' ? 'unknown reason' : code)
}
