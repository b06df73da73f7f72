import type { BasisChange } from '../../../shared/assessment/conclusion.ts';
import type { Category } from '../../../shared/damage/categories.ts';
import type { DecisionBasis } from '../../../shared/schemas/decision-answers.ts';
import { categoryLabel, percentWords } from '../../../shared/presentation/bracket-words.ts';
import { slopeWords } from '../../../shared/presentation/slope-words.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';

type Line = readonly [word: string, value: string];

function labelOf(category: Category | null): string {
  return category === null ? '–' : categoryLabel(category);
}

function strainLines(basis: DecisionBasis): Line[] {
  const { categoryLow, category, categoryHigh, strain, isSettled, breakpoint, reserve } = basis;
  if (category === null || strain === null) return [];
  return [
    [
      'Category',
      `${labelOf(categoryLow)}, ${labelOf(category)}, ${labelOf(categoryHigh)}: low, central, high`,
    ],
    ['Strain', percentWords(strain, 4)],
    ['Over the bracket', isSettled === false ? 'sensitive' : 'settled'],
    ...(breakpoint === null || reserve === null
      ? []
      : [
          [
            'Breakpoint',
            `${breakpoint.toFixed(2)} × central, reserve ${reserve.toFixed(2)}`,
          ] as const,
        ]),
  ];
}

function countWords(count: number): string {
  return count === 1 ? 'one value' : `${count} values`;
}

/** What a decision rests on, line by line. */
export function basisLines(basis: DecisionBasis): Line[] {
  const { stage, settlement, slope, heldBy, sensitivityTotal, assumed, isWorkedOut } = basis;
  return [
    ['Stage', stage === null ? 'not known without a new run' : String(stage)],
    ...(isWorkedOut
      ? [
          [
            'Largest',
            `${millimetresFromMetres(settlement).toFixed(1)} mm, ${slopeWords(slope)}`,
          ] as const,
        ]
      : [['Figures', 'could not be worked out'] as const]),
    ...strainLines(basis),
    ['Held because', heldBy.length === 0 ? 'nothing holds it' : heldBy.join(', ')],
    ...(sensitivityTotal === null
      ? []
      : [['Sensitivity', `${sensitivityTotal} with its category`] as const]),
    ['Assumed', assumed.length === 0 ? 'nothing' : countWords(assumed.length)],
  ];
}

const CHANGED: Readonly<Record<BasisChange['what'], string>> = {
  stage: 'Stage',
  category: 'Category low, central, high',
  settled: 'Over the bracket',
  held: 'Held because',
  sensitivity: 'Sensitivity with its category',
  fault: 'Figures',
  run: 'The building',
};

/** What of a basis has changed, from what to what. */
export function changeLines(changes: readonly BasisChange[]) {
  return changes.map(({ what, was, is }) => ({
    path: CHANGED[what],
    before: was ?? undefined,
    after: is ?? undefined,
  }));
}
