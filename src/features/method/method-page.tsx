import { useEffect, useMemo } from 'react';
import { useLocation } from 'react-router-dom';
import { CAUTIONS, VALIDITY } from '../../../shared/cautions.ts';
import { METHOD_VERSION } from '../../../shared/method-version.ts';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { PATHS } from '../../config/paths.ts';
import { ChecksSection } from './components/checks-section.tsx';
import { DamageTable } from './components/damage-table.tsx';
import { FormulaPart } from './components/formula-list.tsx';
import { MethodContents } from './components/method-contents.tsx';
import { MethodSection } from './components/method-section.tsx';
import { PlainLines, NamedLines } from './components/plain-lines.tsx';
import { ReferencesList } from './components/references-list.tsx';
import { RefusalsList, WarningsList } from './components/warnings-list.tsx';
import type { MethodPart } from './formulas/formula-parts.ts';
import { methodParts } from './formulas/method-parts.ts';
import { NOT_KNOWN } from './method-words.ts';

const PLACES = [
  { id: 'checks', title: 'Checks' },
  { id: 'categories', title: 'Damage categories' },
  { id: 'limits', title: 'How far it holds' },
  { id: 'not-known', title: 'What it does not know' },
  { id: 'warnings', title: 'Warnings and refusals' },
  { id: 'cautions', title: 'Cautions' },
  { id: 'sources', title: 'Sources' },
] as const;

/** Goes to the place that the address names, once the page is there. */
function usePlaceInAddress(): void {
  const { hash } = useLocation();
  useEffect(() => {
    if (hash !== '') document.getElementById(hash.slice(1))?.scrollIntoView();
  }, [hash]);
}

function titleOf(id: (typeof PLACES)[number]['id']): { id: string; title: string } {
  return { id, title: PLACES.find((place) => place.id === id)?.title ?? '' };
}

function Formulas({ parts }: { readonly parts: readonly MethodPart[] }) {
  return (
    <MethodSection id="formulas" title="Formulas" note="in the order of the work">
      {parts.map((part) => (
        <FormulaPart key={part.id} part={part} />
      ))}
    </MethodSection>
  );
}

function AfterFormulas() {
  return (
    <>
      <ChecksSection />
      <MethodSection {...titleOf('categories')}>
        <DamageTable />
      </MethodSection>
      <MethodSection {...titleOf('limits')}>
        <PlainLines lines={VALIDITY} />
      </MethodSection>
      <MethodSection {...titleOf('not-known')}>
        <NamedLines label="What the method does not know" lines={NOT_KNOWN} />
      </MethodSection>
      <MethodSection {...titleOf('warnings')} note="all that a result can carry">
        <WarningsList />
        <h3 className="mt-5 mb-1 text-body">What is refused</h3>
        <RefusalsList />
      </MethodSection>
      <MethodSection {...titleOf('cautions')} note="on every sheet and notice">
        <PlainLines lines={CAUTIONS} />
      </MethodSection>
      <MethodSection {...titleOf('sources')}>
        <ReferencesList />
      </MethodSection>
    </>
  );
}

/** How Groundsill works its figures out, with the checks of it run as the page opens. */
export function MethodPage() {
  const parts = useMemo(() => methodParts(), []);
  usePlaceInAddress();
  const formulas = [{ id: 'formulas', title: 'Formulas' }, ...parts];
  return (
    <div className="relative grid min-h-full grid-cols-[212px_minmax(0,1fr)] max-md:block print:block">
      <div className="border-r border-hairline max-md:hidden print:hidden">
        <div className="sticky top-0 max-h-screen overflow-y-auto pt-[22px] pb-6">
          <MethodContents places={[...formulas, ...PLACES]} />
        </div>
      </div>
      <Page
        title="Method"
        lead={`From the volume that a drive loses to the damage category of a wall, formula by formula, each with its source. Version ${METHOD_VERSION}.`}
      >
        <p className="mb-6 print:hidden">
          <ButtonLink to={PATHS.whatIf}>What-if on one wall</ButtonLink>
        </p>
        <Formulas parts={parts} />
        <AfterFormulas />
      </Page>
    </div>
  );
}
