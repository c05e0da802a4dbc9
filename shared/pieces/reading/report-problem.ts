/** A path of keys and list positions in a file. */
export type Path = readonly (string | number)[]

/** Reports what is wrong at a path: at the key that names the thing, or at its value. */
export type ReportProblem = (path: Path, code: string, message: string, hint: string, side: 'key' | 'value') => void
