import type {} from 'express-session'
import type { Caller } from './caller.ts'

declare global {
  // Express declares its request in this namespace; there is no other way to add to it.
  // eslint-disable-next-line @typescript-eslint/no-namespace
  namespace Express {
    interface Request {
      requestId: string
      caller?: Caller
      endpointName?: string
    }
  }
}

declare module 'express-session' {
  interface SessionData {
    startedAt: string
    lastSeenAt: string
    device: string
    address: string
  }
}
