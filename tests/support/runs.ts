import { defaultRules } from '../../server/commands/default-rules.ts';
import { startRun } from '../../server/commands/start-run.ts';
import { Alignment } from '../../server/models/alignment.ts';
import type { Run } from '../../server/models/run.ts';
import { SchemeRules } from '../../server/models/scheme-rules.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { CreatedBuilding } from '../../server/register/register-edits.ts';
import { aDesign } from './designs.ts';
import { anAlignment, aPerson, aScheme } from './factories.ts';
import { box, change, drawn, E, N } from './register.ts';
import type { TestApp } from './test-app.ts';

/** The rules that a scheme begins with. */
export async function someSchemeRules(scheme: Scheme, createdBy: string): Promise<void> {
  const rules = defaultRules('2026-12-01');
  await SchemeRules.create({ schemeId: scheme.id, version: 1, rules, createdBy });
}

/** A run of an option over the register as it is, worked out. */
export async function aRun(
  { services, runQueue }: Pick<TestApp, 'services' | 'runQueue'>,
  scheme: Scheme,
  option: Alignment,
): Promise<Run> {
  const { id, version } = await Alignment.findByPk(option.id, { rejectOnEmpty: true });
  const asked = { alignmentId: id, alignmentVersion: version };
  const run = await startRun(services(), null, scheme, asked);
  await runQueue().idle();
  return run;
}

const LINE: [number, number][] = [
  [E - 300, N],
  [E + 300, N],
];

/** A line from west to east under the middle of the town below, that moves the ground a good deal. */
export const UNDER_TOWN = aDesign({
  line: LINE,
  volumeLoss: { low: 0.01, central: 0.02, high: 0.03 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
});

/**
 * Four terraces of five houses that stand across the line from 25 m south of it, two houses apart from them
 * and one that is piled, far away.
 */
export function aSmallTown(): CreatedBuilding[] {
  const terraces = [-60, -20, 20, 60].flatMap((east, t) =>
    [0, 1, 2, 3, 4].map((k) =>
      drawn(`T${t}-${k}`, { footprint: box(east, -25 + 10 * k), attributes: { storeys: 3 } }),
    ),
  );
  return [
    ...terraces,
    drawn('near', { footprint: box(110, 4), attributes: { construction: 'masonry' } }),
    drawn('far', { footprint: box(0, 200) }),
    drawn('piled', { footprint: box(40, 220), attributes: { foundation: 'piled' } }),
  ];
}

/** A scheme with its rules, the small town and an option for the line under it. */
export async function aTownToRun(design = UNDER_TOWN) {
  const scheme = await aScheme();
  await someSchemeRules(scheme, (await aPerson()).id);
  await change(scheme, { created: aSmallTown() });
  const option = await anAlignment(scheme, { design });
  return { scheme, option };
}
