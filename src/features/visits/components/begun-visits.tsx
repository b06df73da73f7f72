import { Panel } from '../../../components/ui/panel.tsx';
import { isBlank } from '../draft/kept-visit.ts';
import { useKeptVisits } from '../hooks/use-kept-visits.ts';
import { countWords } from '../visit-words.ts';
import { BuildingLine } from './building-line.tsx';

/** Visits that were begun on this phone and not recorded yet. */
export function BegunVisits({ schemeId }: { readonly schemeId: string }) {
  const { data = [] } = useKeptVisits();
  const begun = data.filter(
    (visit) => visit.state === 'draft' && visit.schemeId === schemeId && !isBlank(visit),
  );
  if (begun.length === 0) return null;
  return (
    <Panel title="Begun on this phone" note="not recorded yet">
      <ul>
        {begun.map(({ id, buildingId, title, findings, photographs }) => (
          <BuildingLine
            key={id}
            schemeId={schemeId}
            building={{ id: buildingId, reference: title, name: null, address: null }}
            note={`${countWords(findings.defects.length, 'defect')}, ${countWords(photographs.length, 'photograph')}`}
          />
        ))}
      </ul>
    </Panel>
  );
}
