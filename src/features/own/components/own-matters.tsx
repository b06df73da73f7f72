import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { MatterThread } from './matter-thread.tsx';

type OwnMattersProps = { readonly matters: readonly OwnMatter[]; readonly mayAnswer: boolean };

/** What an owner asked, reported and claimed at a building, with the answers. */
export function OwnMatters({ matters, mayAnswer }: OwnMattersProps) {
  if (matters.length === 0) return null;
  return (
    <section className="mt-7">
      <h2 className="mb-1 text-h2">My questions and reports</h2>
      {matters.map((matter) => (
        <MatterThread key={matter.id} matter={matter} mayAnswer={mayAnswer} />
      ))}
    </section>
  );
}
