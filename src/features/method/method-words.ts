/** What the method does not know. */
export const NOT_KNOWN: readonly (readonly [string, string])[] = [
  [
    'The stiffness of the building',
    'A stiff building bends less than the ground under it and bridges part of the trough. That is not in it yet: categories come out on the safe side for stiff buildings, and stage 3 is a visit and a judgement.',
  ],
  [
    'How building and ground push on each other',
    'Soil is not a row of springs side by side: what presses at one place moves the ground at every other, so stiffness cannot be put in by a simple factor, and none is.',
  ],
  [
    'Openings, joints and old cracks',
    'A wall with many windows or an old repair is weaker than its outline says. A visit settles it.',
  ],
  [
    'Piles',
    'Piled buildings move with the ground about their piles, not at the surface. They are held, not let go.',
  ],
  [
    'Pipes, tracks and finishes',
    'The categories speak of masonry and plaster. What is more brittle, or carries gas, needs limits of its own.',
  ],
  [
    'What really happens underground',
    'A volume loss is a forecast of workmanship. Readings tell whether it holds.',
  ],
];
