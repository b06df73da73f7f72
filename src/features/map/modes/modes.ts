import type { InstallMode } from './mode.ts';
import { installSelectMode } from './select-mode.ts';

export type ModeName = 'select';

/** What the pointer can do on the map. */
export const MODES: Readonly<Record<ModeName, InstallMode>> = { select: installSelectMode };
