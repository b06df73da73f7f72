import { assessCaseWall } from '../../shared/assessment/assess-case-wall.ts';
import { wallOfCase, type CaseModel } from '../../shared/assessment/model-of-case.ts';
import { workingOfWall } from '../../shared/assessment/working-of-wall.ts';
import { MethodError } from '../../shared/method-error.ts';
import { METHOD_VERSION } from '../../shared/method-version.ts';
import { REFERENCES, type ReferenceKey } from '../../shared/references.ts';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { WARNINGS } from '../../shared/warnings.ts';
import type { WorkingLine } from '../../shared/working.ts';
import { preparedCase } from './assess-walls.ts';
import { CaseError } from './case-error.ts';

type CaseWall = AssessCase['walls'][number];

const CAUTION =
  'The method estimates ground movement empirically. It does not replace a site visit, a condition survey or the judgement of a chartered engineer; local codes, statutory procedures and licensed practice govern. Predictions are to be followed by measurements.';

function figure(value: number): string {
  return String(Number(value.toPrecision(7)));
}

function lineText({
  symbol,
  meaning,
  expression,
  inputs,
  value,
  unit,
  reference,
}: WorkingLine): string {
  const put = Object.entries(inputs).map(([name, number]) => `${name} = ${figure(number)}`);
  return [
    `  ${symbol}: ${meaning}`,
    `    ${symbol} = ${expression}`,
    ...(put.length === 0 ? [] : [`    with ${put.join(', ')}`]),
    `    = ${figure(value)}${unit === '' ? '' : ` ${unit}`}   [${reference}]`,
  ].join('\n');
}

function rulesText({ rules }: CaseModel): string {
  const cutOff =
    rules.cutOff.kind === 'settlement'
      ? `settlement ignored below ${rules.cutOff.settlement * 1000} mm`
      : `ignored beyond ${rules.cutOff.widths} trough widths of every drive`;
  return `Rules: depth ${rules.depth.kind}; focus ${rules.focus}; ${cutOff}; horizontal strain ${rules.horizontalStrain}; compression ${rules.compression}; category that leads on ${rules.leadingCategory}.`;
}

function facesText({ model, faces }: CaseModel): string {
  const each = model.drives.map(({ name, faceShare, laterFactor }, index) => {
    const face = faces[index];
    const state =
      face === undefined || face >= (model.lengths[index] ?? 0)
        ? 'complete'
        : `face at chainage ${face} m, share above the face ${faceShare}`;
    return `"${name}" ${state}${laterFactor === 1 ? '' : `, later factor ${laterFactor}`}`;
  });
  return `Drives: ${each.join('; ')}.`;
}

function sourcesText(keys: ReadonlySet<ReferenceKey>): string {
  const lines = [...keys].sort().map((key) => {
    const { authors, year, title, where } = REFERENCES[key];
    return `  [${key}] ${authors}${year === 0 ? '' : ` (${year})`}. ${title}. ${where}.`;
  });
  return ['Sources', ...lines].join('\n');
}

function rangeText(prepared: CaseModel, wall: CaseWall): string[] {
  const { bracket, breakpoint, reserve, settled, governing } = assessCaseWall(prepared, wall);
  if (bracket === undefined || breakpoint === undefined) return [];
  const rows = bracket.volumeLoss.map(
    (level, v) =>
      `    V_L ${level.padEnd(8)}${(bracket.strains[v] ?? []).map((e, k) => `${(e * 100).toFixed(4)} % (${bracket.categories[v]?.[k] ?? 0})`.padStart(14)).join('')}`,
  );
  const found = breakpoint.reached
    ? `reached at ${figure(breakpoint.factor)} times the central volume loss, ${(breakpoint.volumeLoss * 100).toFixed(3)} % of drive "${breakpoint.drive}", with K ${breakpoint.troughWidth} and E/G ${breakpoint.eOverG}; reserve ${((reserve?.overCentral ?? 0) * 100).toFixed(1)} % over central, ${((reserve?.overHigh ?? 0) * 100).toFixed(1)} % over high`
    : `none below ${breakpoint.upTo * 100} %`;
  return [
    [
      'The bracket: strain (category), K from low to high across; the worst over E/G',
      ...rows,
      `  Breakpoint, the volume loss that reaches category ${prepared.rules.leadingCategory}: ${found}.`,
      `  ${settled ? 'Settled: one category over the whole bracket.' : `Sensitive, most of all to ${governing?.input ?? 'several inputs together'}.`}`,
    ].join('\n'),
  ];
}

function wallNamed({ walls }: AssessCase, name: string): [CaseWall, number] {
  const found = [...walls.entries()].filter(([, wall]) => wall.name === name);
  const [only, another] = found;
  if (only === undefined) throw new CaseError(`--working: no wall is named "${name}"`);
  if (another !== undefined) {
    throw new CaseError(
      `--working: walls[${only[0]}] and walls[${another[0]}] are both named "${name}"`,
    );
  }
  return [only[1], only[0]];
}

/** The whole working of one wall as text. */
export function workingText({ walls, ...input }: AssessCase, name: string): string {
  const [caseWall, index] = wallNamed({ walls, ...input }, name);
  const prepared = preparedCase(input);
  try {
    const wall = wallOfCase(caseWall, prepared.groundLevel);
    const { result, sections } = workingOfWall(
      prepared.model,
      wall,
      prepared.rules,
      prepared.faces,
    );
    const keys = new Set(sections.flatMap(({ lines }) => lines.map((line) => line.reference)));
    const blocks = [
      `Working of wall "${name}", method version ${METHOD_VERSION}\nMetres, levels above datum, strains as m/m, settlement positive down, tension positive.`,
      `${rulesText(prepared)}\n${facesText(prepared)}`,
      ...sections.map(({ title, lines }) => [title, ...lines.map(lineText)].join('\n')),
      `Result: strain ${(result.strain * 100).toFixed(5)} %, category ${result.category === 4 ? '4–5' : result.category}, Rankin ${result.rankin}.`,
      ...rangeText(prepared, caseWall),
      ...result.warnings.map((warning) => `Warning, ${warning}: ${WARNINGS[warning]}`),
      sourcesText(keys),
      CAUTION,
    ];
    return `${blocks.join('\n\n')}\n`;
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    throw new CaseError(`walls[${index}].${error.field ?? 'name'}: ${error.message}`);
  }
}
