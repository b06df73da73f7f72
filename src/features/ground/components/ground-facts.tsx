import type { GroundAnswer } from '../../../../shared/schemas/ground.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { kindWords, levelFacts, rangeWords } from '../ground-words.ts';
import { RemoveGround } from './remove-ground.tsx';

type GroundFactsProps = {
  readonly schemeId: string;
  readonly answer: GroundAnswer;
  readonly mayChange: boolean;
};

/** What a scheme's ground is, where it comes from, and which buildings took their level from it. */
export function GroundFacts({ schemeId, answer, mayChange }: GroundFactsProps) {
  const { ground, buildings } = answer;
  const levels = levelFacts(buildings);
  return (
    <Panel
      title="What there is"
      action={mayChange && ground !== null && <RemoveGround schemeId={schemeId} />}
    >
      {ground === null ? (
        <p className="py-3 text-body text-ink-2">
          No ground yet. Buildings that bring no level of their own have none.
        </p>
      ) : (
        <Facts
          facts={[
            ['Levels', kindWords(ground)],
            ['Between', rangeWords(ground)],
            ['Source', ground.source],
            ['Brought by', `${ground.by ?? 'somebody'}, ${formatMoment(ground.at)}`],
          ]}
        />
      )}
      {levels.length > 0 && (
        <>
          <h3 className="mt-3 mb-0.5 text-small">Ground level of the buildings</h3>
          <Facts facts={levels} />
        </>
      )}
    </Panel>
  );
}
