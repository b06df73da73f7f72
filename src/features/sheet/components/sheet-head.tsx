import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { buildingPath, registerPath, visitPath } from '../../../config/paths.ts';
import { overBracketWords } from '../../../../shared/presentation/verdict-words.ts';
import { stageWords } from '../../../../shared/presentation/result-words.ts';
import { useSeed } from '../samples/use-seed.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { SheetsBeside } from './sheets-beside.tsx';

type SheetHeadProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly building: RunBuilding;
};

function Verdict({ result }: Pick<RunBuilding, 'result'>) {
  const { category, fault } = result;
  const range = overBracketWords(result);
  if (fault !== null) return <p className="text-roomy font-semibold">Not worked out</p>;
  if (category === null || range === null) {
    return (
      <p className="text-roomy">
        <b className="font-semibold">{stageWords(result)}</b>
        <span className="block text-small text-ink-2">by screening, over the whole bracket</span>
      </p>
    );
  }
  return (
    <p className="flex items-center gap-3">
      <span className="text-h2">
        <DamageChip category={category} />
      </span>
      <span className="text-roomy">
        <b className="inline-block font-semibold first-letter:uppercase">
          {CATEGORIES[category]?.name}
        </b>
        <span className="block text-small text-ink-2">{range}</span>
      </span>
    </p>
  );
}

/** What building this is, where it stands in the answer, and what can be done with its sheet. */
export function SheetHead({ schemeId, run, building }: SheetHeadProps) {
  const scheme = useScheme();
  const { facts, result } = building;
  const id = Number(facts.id);
  const { seed } = useSeed(run.id);
  const buildingApi = `/api/schemes/${schemeId}/runs/${run.id}/buildings/${id}`;
  return (
    <header className="flex flex-wrap items-center gap-x-8 gap-y-3 border-b-2 border-ink px-8 py-3.5 max-sm:px-4 print:px-0">
      <div className="min-w-0 flex-1 max-sm:basis-full">
        <p className="text-small text-ink-3">
          Sheet · {facts.reference} · {scheme.name}
        </p>
        <h1 className="text-h1 break-words max-sm:text-h2">
          {facts.name ?? facts.address ?? facts.reference}
        </h1>
      </div>
      <Verdict result={result} />
      <div className="flex flex-wrap gap-2 print:hidden">
        <SheetsBeside schemeId={schemeId} runId={run.id} building={building} />
        <ButtonLink to={`${buildingPath(schemeId, id)}&run=${run.id}`}>Show on plan</ButtonLink>
        <ButtonLink to={`${registerPath(schemeId)}?building=${id}`}>Show in register</ButtonLink>
        {can(scheme, 'recordVisits') && <ButtonLink to={visitPath(schemeId, id)}>Visit</ButtonLink>}
        <a
          className="inline-flex items-center text-small underline"
          href={`${buildingApi}/case`}
          download
        >
          The case for assess
        </a>
        <a
          className={buttonStyle('plain')}
          href={`${buildingApi}/sheet.pdf${seed === null ? '' : `?samples=${seed}`}`}
          download
        >
          PDF
        </a>
        <Button
          onClick={() => {
            window.print();
          }}
        >
          Print
        </Button>
      </div>
    </header>
  );
}
