import 'vitest';

declare module 'vitest' {
  interface ProvidedContext {
    /** Addresses of the throw-away cluster, with DATABASE where the name of the database goes. */
    cluster: { superUrl: string; ownerUrl: string; serverUrl: string };
    /**
     * The running demos, one a worker, each with the folder that says that it is taken; and what may be
     * signed in with, for journeys in the browser.
     */
    demo: { places: { address: string; claim: string }[]; password: string };
  }
}
