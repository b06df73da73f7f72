import { useState } from 'react';
import { Link, useLocation } from 'react-router-dom';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { PATHS } from '../../config/paths.ts';
import { AboutSheet } from './components/about-sheet.tsx';
import { WhatIfAnswerView } from './components/what-if-answer.tsx';
import { WhatIfForm } from './components/what-if-form.tsx';
import type { LeftOut } from './what-if/left-out.ts';
import { readDraft, readLeftOut, whatIfPath } from './what-if/what-if-address.ts';
import { TYPED, useWhatIf } from './what-if/use-what-if.ts';
import type { WhatIfDraft } from './what-if/what-if-fields.ts';

type Start = { readonly draft: WhatIfDraft; readonly leftOut: readonly LeftOut[] | null };

function isStart(draft: WhatIfDraft): boolean {
  return whatIfPath(draft) === PATHS.whatIf;
}

/** What the figures began with. */
function AboutStart({ draft, leftOut }: Start) {
  if (leftOut === null && isStart(draft)) {
    return (
      <p className="mb-3 text-small text-ink-2">
        At the central values this is the wall of the check{' '}
        <Link to={`${PATHS.method}#check-wall-square-to-drive`}>square to a drive</Link>: its
        figures are the published ones.
      </p>
    );
  }
  return (
    <>
      {leftOut !== null && <AboutSheet leftOut={leftOut} />}
      <ButtonLink to={PATHS.whatIf} className="mb-3 print:hidden">
        Back to the check
      </ButtonLink>
    </>
  );
}

function WhatIf({ draft: start, leftOut }: Start) {
  const whatIf = useWhatIf(start, leftOut);
  const { draft, shown, isBehind } = whatIf;
  return (
    <div className="relative grid gap-x-8 gap-y-6 lg:grid-cols-[272px_minmax(0,1fr)] print:block">
      <div className="min-w-0">
        <AboutStart draft={draft} leftOut={leftOut} />
        <WhatIfForm whatIf={whatIf} />
      </div>
      <div className="min-w-0">
        {isBehind && (
          <p role="status" className="mb-3 border-l-4 border-clay bg-clay-wash px-3 py-2">
            {shown === null
              ? 'These figures cannot be worked out. What is wrong stands beside its field.'
              : 'Shown for the last figures that fit. What is wrong stands beside its field.'}
          </p>
        )}
        {shown !== null && <WhatIfAnswerView worked={shown} />}
      </div>
    </div>
  );
}

/** One wall and one drive whose figures may be changed, worked out at each change. */
export function WhatIfPage() {
  const location = useLocation();
  const { key, search } = location;
  const words = new URLSearchParams(search);
  const isTyped = location.state === TYPED;
  const [arrived, setArrived] = useState(key);
  // an address from elsewhere starts anew; one that the fields have written does not
  if (!isTyped && arrived !== key) setArrived(key);
  return (
    <Page
      title="What-if on one wall"
      lead={
        <>
          <Link to={PATHS.method}>Method</Link> · One straight level drive, complete, under one
          straight wall. Nothing here is recorded; the address keeps it, to be sent to somebody.
        </>
      }
    >
      <WhatIf key={arrived} draft={readDraft(words)} leftOut={readLeftOut(words)} />
    </Page>
  );
}
