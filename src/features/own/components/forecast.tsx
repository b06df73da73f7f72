import { ownerHeadline, ownerParagraph, staysUsable } from '../../../../shared/presentation/owner-words.ts'; // prettier-ignore
import type { OwnBuilding } from '../../../../shared/schemas/own.ts';
import { addressOf, measureState, placeOf } from '../own-words.ts';
import { CrackPicture } from './crack-picture.tsx';

function Headline({ children }: { readonly children: string }) {
  return <h1 className="mb-1 text-figure leading-tight text-balance max-sm:text-h1">{children}</h1>;
}

function NothingYet({ building }: { readonly building: OwnBuilding }) {
  return (
    <>
      <Headline>We are looking at what the tunnel means for you</Headline>
      <p className="mb-4 text-lead text-ink-2">{addressOf(building)}</p>
      <p className="mb-3 max-w-[34em]">
        {`Our engineers work out how the ground will move near your ${placeOf(building)}. When that is done and has been checked, we write to you. What the letter says then stands here too. You need do nothing until then.`}
      </p>
    </>
  );
}

/** What has been decided, what is done about it, and what the promoter says of repairs. */
function WhatWeDo({ decision, measures, repairs }: OwnBuilding & { readonly repairs: string }) {
  return (
    <section className="mt-5">
      <h2 className="mb-1 text-h2">What we will do</h2>
      {decision !== null && <p className="max-w-[34em]">{decision}</p>}
      {measures.length > 0 && (
        <ul className="mt-1 list-disc pl-5">
          {measures.map(({ title, state }, k) => (
            <li key={`${title} ${k}`}>{`${title}: ${measureState(state)}`}</li>
          ))}
        </ul>
      )}
      <p className="mt-1 max-w-[34em]">{repairs}</p>
    </section>
  );
}

/** What an owner is told: one sentence, one paragraph, one picture, and what is done. */
export function Forecast({
  building,
  repairs,
}: {
  readonly building: OwnBuilding;
  readonly repairs: string;
}) {
  const { figures } = building;
  if (figures === null) return <NothingYet building={building} />;
  const place = placeOf(building);
  return (
    <>
      <Headline>{ownerHeadline(figures, place)}</Headline>
      <p className="mb-4 text-lead text-ink-2">{addressOf(building)}</p>
      <p className="mb-3 max-w-[34em]">{ownerParagraph(figures, place)}</p>
      <CrackPicture category={figures.category} />
      <p className="max-w-[34em] text-h3 text-ink-2">{staysUsable(figures.category, place)}</p>
      <WhatWeDo {...building} repairs={repairs} />
    </>
  );
}
