import { pino, type DestinationStream, type Logger } from 'pino'

/** Fields that would hold secrets if somebody logged the thing around them. */
const secretFields = [
  'authorization',
  'cookie',
  'password',
  'current',
  'next',
  'secret',
  'token',
  'secretHash',
  'passwordHash',
  '["set-cookie"]',
]
const paths = secretFields.flatMap((field) => {
  const dotted = field.startsWith('[') ? field : `.${field}`
  return [field, `*${dotted}`, `*.*${dotted}`, `*.*.*${dotted}`]
})

/** One JSON line for each event, without secrets. */
export const createLog = (level: string, destination?: DestinationStream): Logger =>
  pino(
    {
      level,
      base: null,
      redact: { paths, censor: '[kept back]' },
      serializers: {
        err: (error: unknown) =>
          error instanceof Error
            ? { name: error.name, message: error.message, code: (error as { code?: unknown }).code, stack: error.stack }
            : { message: String(error) },
      },
    },
    destination ?? pino.destination({ dest: 1, sync: false }),
  )
