import type { Route } from './define-route.ts';
import { schemeRoutes } from './schemes.ts';

/** Every route there is; a test walks this list for every role. */
export const ROUTES: readonly Route[] = [...schemeRoutes];
