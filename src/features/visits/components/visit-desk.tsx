import { useState } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { visitsPath } from '../../../config/paths.ts';
import { momentHere, seenOf, type KeptVisit } from '../draft/kept-visit.ts';
import { useVisitDraft } from '../hooks/use-visit-draft.ts';
import { visitFaults } from '../visit-faults.ts';
import { DefectsPart } from './defects-part.tsx';
import { FaultsNote } from './faults-note.tsx';
import { KeptOnPhone } from './kept-on-phone.tsx';
import { NotesPart } from './notes-part.tsx';
import { PartChoice } from './part-choice.tsx';
import { PhotographsPart } from './photographs-part.tsx';
import { RegisterPart } from './register-part.tsx';

type VisitDeskProps = {
  readonly opened: KeptVisit;
  /** Null where the register cannot be reached. */
  readonly building: BuildingAnswer | null;
};

/** What was left off, on top of the register as it is, unless values were written on top of an older one. */
function onRegister(opened: KeptVisit, building: BuildingAnswer | null): KeptVisit {
  const hasValues = Object.values(opened.findings.texts).some((text) => text.trim() !== '');
  if (building === null || (opened.seen !== null && hasValues)) return opened;
  return { ...opened, seen: seenOf(building) };
}

function Recorded({ schemeId }: { readonly schemeId: string }) {
  return (
    <>
      <p className="mb-3 text-roomy">The visit is recorded on this phone.</p>
      <KeptOnPhone schemeId={schemeId} />
      <div className="mt-4">
        <ButtonLink to={visitsPath(schemeId)}>Go to the next building</ButtonLink>
      </div>
    </>
  );
}

/** A visit being written, and what becomes of it once it is recorded. */
export function VisitDesk({ opened, building }: VisitDeskProps) {
  const draft = useVisitDraft(onRegister(opened, building));
  const [faults, setFaults] = useState<readonly string[]>([]);
  const { visit } = draft;
  if (visit.state === 'kept') return <Recorded schemeId={visit.schemeId} />;

  function record(): void {
    const visitedAt = momentHere(new Date());
    const whole: KeptVisit = { ...visit, state: 'kept', visitedAt, fault: null };
    const found = visitFaults(whole);
    setFaults(found);
    if (found.length === 0) void draft.record(whole);
  }
  return (
    <div className="max-w-[720px]">
      <KeptOnPhone schemeId={visit.schemeId} />
      <PartChoice draft={draft} />
      <RegisterPart draft={draft} />
      <DefectsPart draft={draft} />
      <PhotographsPart draft={draft} />
      <NotesPart draft={draft} />
      <FaultsNote faults={faults} stands={draft.fault} />
      <div className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-rule pt-3">
        <Button kind="main" onClick={record}>
          Record visit
        </Button>
        <p className="text-small text-ink-2">
          What you write is kept on this phone, also without a network.
        </p>
      </div>
    </div>
  );
}
