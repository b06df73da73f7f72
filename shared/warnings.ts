/**
 * Every warning that a result may carry, by name, with what it means. A warning never changes a
 * figure in silence: it says what a reader must know to use it.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const WARNINGS = {
  'not affected': 'No 0.5 m of the wall settles by more than the settlement that is ignored.',
  'flat along the wall':
    'The wall settles without bending along its length. Where it runs along a drive, only the moving face strains it.',
  'short wall': 'The wall is shorter than 0.5 m and is not assessed.',
  'founded within one diameter of the crown':
    'Near a tunnel the trough is less certain than farther from it.',
  'cover under one diameter': 'The method is meant for more than one diameter of cover.',
  'drive above the founding level left out':
    'Part of a drive rises above the founding level, too far off in plan to matter, and is left out.',
  'depth rule for clay with K below 0.4':
    'The rule for depth in clay holds for K of 0.4 and more. In sand use the constant rule.',
  'trough width rule outside its depths':
    'The rule was drawn from cases at other depths than this one.',
  'deep focus outside its range':
    'The deep focus is meant for the clay depth rule with K between 0.4 and 0.6.',
  'ground level assumed': 'The ground level at the wall was not given and is taken from elsewhere.',
  'later drive increased': 'The volume loss of a later drive carries an explicit factor.',
} as const;

/**
 * The name of a warning.
 *
 * Units: none. Valid: a key of WARNINGS. Source: [own].
 */
export type Warning = keyof typeof WARNINGS;
