import 'express-session';

declare module 'express-session' {
  interface SessionData {
    csrfToken?: string;
    /** When the person's sessions were last ended everywhere; an older session is not theirs. */
    signedInAt?: number;
  }
}

declare global {
  namespace Express {
    interface User {
      id: string;
      isAdministrator: boolean;
    }
  }
}
