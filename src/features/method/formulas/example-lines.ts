import { groundModel } from '../../../../shared/ground/ground-model.ts';
import { recordTroughWidth } from '../../../../shared/ground/record-trough-width.ts';
import type { TroughWidthRule } from '../../../../shared/ground/trough-width-rule.ts';
import { DEFAULT_RULES } from '../../../../shared/assessment/rules.ts';
import { workingOfWall } from '../../../../shared/assessment/working-of-wall.ts';
import { certain } from '../../../../shared/numerics/range.ts';
import type { WorkingLine } from '../../../../shared/working.ts';
import type { MethodFormula } from './formula-parts.ts';

const WALL = {
  name: 'wall',
  segment: { start: [0, 2], end: [0, 28] },
  groundLevel: 0,
  foundingLevel: 0,
  height: 12,
  eOverG: certain(2.6),
  poisson: 0.3,
} as const;

const DRIVE = {
  name: 'drive',
  axis: [
    [-200, 0, -20],
    [200, 0, -20],
  ],
  diameter: 6,
  volumeLoss: certain(0.015),
  troughWidth: certain(0.5),
  intervals: [],
  faceShare: 0.5,
  laterFactor: 1,
} as const;

const EVERY_OTHER_WAY = {
  ...DEFAULT_RULES,
  focus: 'deep',
  horizontalStrain: 'peak',
  compression: 'zero',
} as const;

/** The working of one wall by the usual rules, and by every other choice of rule. */
function exampleLines(): readonly WorkingLine[] {
  const usual = workingOfWall(groundModel([DRIVE], DEFAULT_RULES), WALL, DEFAULT_RULES, []);
  const later = groundModel([{ ...DRIVE, laterFactor: 1.2 }], EVERY_OTHER_WAY);
  const other = workingOfWall(later, WALL, EVERY_OTHER_WAY, []);
  return [...usual.sections, ...other.sections].flatMap(({ lines }) => lines);
}

/** The trough width by one rule. */
export function widthFormula(
  kind: Exclude<TroughWidthRule['kind'], 'layered'> | 'layered',
): MethodFormula {
  const lines: WorkingLine[] = [];
  const rule: TroughWidthRule<number> =
    kind === 'layered' ? { kind, layers: [{ baseLevel: -100, troughWidth: 0.5 }] } : { kind };
  recordTroughWidth(rule, 0.5, { ground: 0, founding: -1, axis: -20 }, (line) => {
    lines.push(line);
  });
  return formulaOf(lines, 'i');
}

function formulaOf(lines: readonly WorkingLine[], symbol: string, sign = ''): MethodFormula {
  const line = lines.find((one) => one.symbol === symbol && one.expression.includes(sign));
  if (line === undefined) throw new Error(`No working has a line for ${symbol}.`);
  const { meaning, expression, unit, reference } = line;
  return { symbol, meaning, expression, unit, reference };
}

/**
 * Gives the formulas that the workings write, by symbol and, where there are several, by what stands in the one
 * that is meant; `meaning` says in general what a working says of its own case.
 */
export function formulasOfWorkings() {
  const lines = exampleLines();
  return (symbol: string, meaning?: string, sign?: string): MethodFormula => {
    const found = formulaOf(lines, symbol, sign);
    return meaning === undefined ? found : { ...found, meaning };
  };
}

/** Takes a formula of a working by its symbol. */
export type TakeFormula = ReturnType<typeof formulasOfWorkings>;
