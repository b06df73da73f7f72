import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The keys that move the map. */
export const MAP_KEYS: readonly KeyHelp[] = [
  { keys: ['+', '−'], does: 'Zoom in and out' },
  { keys: ['F'], does: 'Fit the scheme' },
  { keys: ['←', '↑', '↓', '→'], does: 'Move the map, while it has the focus' },
];

/** The keys that go from building to building. */
export const BUILDING_KEYS: readonly KeyHelp[] = [
  { keys: ['J', 'K'], does: 'Next and previous building' },
  { keys: ['Esc'], does: 'Deselect the building' },
];
