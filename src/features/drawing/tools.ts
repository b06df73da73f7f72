import type { Draft } from './drafts/draft.ts';

/** What the column of tools offers. */
export type ToolId = 'select' | Draft['tool'] | 'remove' | 'undo' | 'redo';

export type Tool = {
  readonly id: ToolId;
  readonly name: string;
  /** As it stands on the keyboard. */
  readonly key: string;
  /** Drawn 18 by 18. */
  readonly path: string;
  /** Begins another group. */
  readonly isApart?: boolean;
};

export const TOOLS: readonly Tool[] = [
  { id: 'select', name: 'Select', key: 'V', path: 'M5 2.5v11.6l2.9-2.7 2 4.2 1.8-.9-2-4.1h4z' },
  { id: 'draw', name: 'Draw a building', key: 'D', path: 'M2.5 7.5v8h10V10M2.5 7.5h4.5M13 2v7M9.5 5.5h7', isApart: true },
  { id: 'edit', name: 'Edit the outline', key: 'E', path: 'M5 4.5h8.5M4 5.5v8M14.5 5.5v8M5 14h8.5M2.5 3h3v3h-3zM13 3h3v3h-3zM13 12.5h3v3h-3zM2.5 12.5h3v3h-3z' },
  { id: 'split', name: 'Split', key: 'C', path: 'M7 4H2.5v10H7M11 4h4.5v10H11M9 1.5v3M9 6.5v2M9 10.5v2M9 14v2.5' },
  { id: 'join', name: 'Join', key: 'U', path: 'M9 4H2.5v10H9M9 4h6.5v10H9M9 4v1M9 7v1M9 10v1M9 13v1M6 9h6M6 9l1.5-1.5M12 9l-1.5 1.5' },
  { id: 'remove', name: 'Remove', key: 'Delete', path: 'M3 5h12M7 5V3h4v2M4.5 5l.8 10.5h7.4L13.5 5M7.5 8v4.5M10.5 8v4.5' },
  { id: 'undo', name: 'Undo', key: 'Ctrl Z', path: 'M6 3 2.5 6.5 6 10M2.5 6.5H11a4.25 4.25 0 0 1 0 8.5H7', isApart: true },
  { id: 'redo', name: 'Redo', key: 'Ctrl Shift Z', path: 'M12 3l3.5 3.5L12 10M15.5 6.5H7A4.25 4.25 0 0 0 7 15h4' },
]; // prettier-ignore

/** What the tools depend on. */
export type Situation = {
  readonly tool: ToolId;
  readonly hasBuilding: boolean;
  /** Steps of the draft; null while nothing is drawn. */
  readonly steps: { readonly past: number; readonly future: number } | null;
  /** Changes that were saved from here and can be taken back. */
  readonly saved: number;
  /** Of these, those that were taken back and can be done again. */
  readonly undone: number;
  /** Values of a building are being written. */
  readonly isWriting: boolean;
};

/** Why a tool cannot be used now, or null. */
export function reasonAgainst(id: ToolId, now: Situation): string | null {
  if (now.isWriting && id !== 'select') return 'Save the values, or leave them, first.';
  switch (id) {
    case 'edit':
    case 'split':
    case 'remove':
      return now.hasBuilding || now.tool === id ? null : 'Select a building first.';
    case 'undo':
      if (now.steps !== null) return now.steps.past > 0 ? null : 'Nothing to take back here.';
      return now.saved > 0 ? null : 'Nothing was changed here yet.';
    case 'redo':
      return (now.steps?.future ?? now.undone) > 0 ? null : 'Nothing was taken back.';
    case 'select':
    case 'draw':
    case 'join':
      return null;
  }
}
