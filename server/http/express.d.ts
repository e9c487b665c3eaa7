import 'express-session';
import type { Person } from './person';

declare global {
  namespace Express {
    interface Request {
      /** The signed-in person, read anew for this request. */
      person?: Person;
    }
    interface User {
      id: string;
    }
  }
}

declare module 'express-session' {
  interface SessionData {
    /** When this sign-in happened (ISO 8601): sessions older than people.sessions_from are void. */
    since?: string;
    /** Last request, for the idle limit. */
    seen?: string;
  }
}
