import { installLineMode } from './line-mode.ts';
import type { DraftMode, InstallDraftMode, InstallMode } from './mode.ts';
import { installOutlineMode } from './outline-mode.ts';
import { installSelectMode } from './select-mode.ts';

export type ModeName = 'select';

/** What the pointer can do on the map. */
export const MODES: Readonly<Record<ModeName, InstallMode>> = { select: installSelectMode };

/** What the pointer can do to a drawing. */
export const DRAFT_MODES: Readonly<Record<DraftMode, InstallDraftMode>> = {
  line: installLineMode,
  outline: installOutlineMode,
};
