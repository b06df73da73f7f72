import { useMemo } from 'react';
import { limitedDesign } from '../../../../shared/assessment/limited-design.ts';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import { resultOfOutcome } from '../../../../shared/assessment/result-of-outcome.ts';
import type { Measure } from '../../../../shared/schemas/measures.ts';
import type { RunBuilding, RunDetail, RunResult } from '../../../../shared/schemas/runs.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';

type LimitEffectProps = {
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly limit: NonNullable<Measure['limit']>;
};

function Categories({ result }: { readonly result: RunResult }) {
  const { categoryLow, category, categoryHigh } = result;
  const three = [categoryLow, category, categoryHigh].flatMap((one) => one ?? []);
  if (three.length < 3) return <>let go at stage {result.stage}</>;
  return (
    <span className="inline-flex gap-1.5">
      {three.map((one, k) => (
        <DamageChip key={k} category={one} />
      ))}
    </span>
  );
}

function Row({ words, result }: { readonly words: string; readonly result: RunResult }) {
  const { settlement, strain } = result;
  return (
    <tr className="[&>*]:border-b [&>*]:border-hairline [&>*]:py-1 [&>*]:pr-2">
      <th scope="row" className="text-left font-normal text-ink-2">
        {words}
      </th>
      <td className="text-right">{millimetresFromMetres(settlement).toFixed(1)}</td>
      <td className="text-right">{strain === null ? '–' : percentWords(strain, 3)}</td>
      <td>
        <Categories result={result} />
      </td>
    </tr>
  );
}

/** What a limit of volume loss makes of the building, worked out here by the functions of the run. */
export function LimitEffect({ run, building, limit }: LimitEffectProps) {
  const limited = useMemo(() => {
    const { facts, rows } = building;
    const design = limitedDesign(run.design, limit);
    const sheet = sheetOfBuilding(design, run.rules, facts, new Map([[facts.id, rows]]));
    return resultOfOutcome(sheet.outcome);
  }, [run, building, limit]);
  return (
    <table aria-label="What the limit does" className="mt-1 w-full text-small">
      <thead>
        <tr className="text-left text-cap text-ink-3 [&>*]:pr-2 [&>*]:font-normal">
          <th scope="col">
            <span className="sr-only">Which</span>
          </th>
          <th scope="col" className="text-right">
            mm
          </th>
          <th scope="col" className="text-right">
            strain
          </th>
          <th scope="col">low, central, high</th>
        </tr>
      </thead>
      <tbody>
        <Row words={`Run ${run.number}`} result={building.result} />
        <Row words="With the limit" result={limited} />
      </tbody>
    </table>
  );
}
