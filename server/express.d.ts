import 'express-session';

declare module 'express-session' {
  interface SessionData {
    csrfToken?: string;
    /** When the person signed in, in ms; sessions from before people.sessions_valid_from are ended. */
    signedInAt?: number;
  }
}

declare global {
  namespace Express {
    interface User {
      id: string;
      name: string;
      email: string;
      isAdministrator: boolean;
    }
  }
}
