import 'passport'
import type { Role } from '@shared/schemas/role'
import type { Company } from '@shared/schemas/company'

/** The person a request comes from, read afresh from the database for every request. */
export interface SignedIn {
  id: string
  companyId: string
  name: string
  email: string
  roles: Role[]
  lastSignIn: string | null
  company: Company
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- passport names its user here
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type
    interface User extends SignedIn {}
  }
}

declare module 'express-session' {
  interface SessionData {
    /** The token that requests which change something must carry. */
    csrf: string
    /** Whose it is; nobody's before sign-in. */
    person?: { id: string; companyId: string }
    /** Set by the session store on a session it has read, never written. */
    readonly known?: boolean
    /** The hour of its latest use, counted from 1970. */
    usedInHour?: number
  }
}
