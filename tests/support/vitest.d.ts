import 'vitest';

declare module 'vitest' {
  interface ProvidedContext {
    /** Addresses of the throw-away cluster, with DATABASE where the name of the database goes. */
    cluster: { superUrl: string; ownerUrl: string; serverUrl: string };
    /** The address of the running demo and what may be signed in with, for journeys in the browser. */
    demo: { address: string; password: string };
  }
}
