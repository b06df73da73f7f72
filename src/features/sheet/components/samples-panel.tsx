import type { OpenedSamples } from '../../../../shared/assessment/opened-samples.ts';
import { SAMPLES } from '../../../../shared/assessment/sampled-run.ts';
import { LARGEST_SEED } from '../../../../shared/numerics/random-numbers.ts';
import { percentWords, settledWords } from '../../../../shared/presentation/bracket-words.ts';
import {
  drawnFromWords,
  governingWords,
  SAMPLES_CAUTION,
  SAMPLES_PURPOSE,
  seedWords,
  shareWords,
} from '../../../../shared/presentation/sample-words.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { HatchSwatch } from '../../../components/ui/hatch-swatch.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { WorkingPopover } from '../../assessment/components/working-popover.tsx';
import type { SamplesState } from '../samples/use-samples.ts';

type SamplesPanelProps = SamplesState & {
  readonly seed: number | null;
  readonly onDraw: (seed: number) => void;
};

/** The first seed is the same for everybody; the next ones follow, so that none is chosen for its answer. */
const FIRST_SEED = 1;

function seedAfter(seed: number): number {
  return seed === LARGEST_SEED ? 0 : seed + 1;
}

function Shares({ categories }: OpenedSamples) {
  return (
    <table className="w-full text-small" aria-label="Share of the samples in each category">
      <tbody>
        {categories.map(({ category, count, share, working }) => (
          <tr key={category} className="border-b border-hairline last:border-0">
            <th scope="row" className="w-[64px] py-1 text-left font-normal whitespace-nowrap">
              <DamageChip category={category} />
            </th>
            <td aria-hidden="true" className="py-1">
              {count > 0 && (
                <span className="flex min-w-[3px]" style={{ width: `${percentFromRatio(share)}%` }}>
                  <HatchSwatch category={category} className="h-3 w-full" />
                </span>
              )}
            </td>
            <td className="w-[64px] py-1 pl-2 text-right whitespace-nowrap">
              <WorkingPopover title="share of the samples" lines={working}>
                {percentWords(share, 1)}
              </WorkingPopover>
            </td>
            <td className="w-[38px] py-1 text-right text-cap text-ink-2">
              {count}
              <span className="sr-only"> of the samples</span>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Strains({ strains }: OpenedSamples) {
  return (
    <table className="mt-2 w-full table-fixed text-small">
      <caption className="pb-0.5 text-left text-cap text-ink-2">
        Strain in % that so many of the samples do not pass
      </caption>
      <thead>
        <tr className="text-cap text-ink-2">
          {strains.map((one) => (
            <th key={one.share} scope="col" className="text-right font-normal">
              {shareWords(one)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        <tr className="border-t border-hairline">
          {strains.map((one) => (
            <td key={one.share} className="pt-1 text-right">
              <StrainOf {...one} />
            </td>
          ))}
        </tr>
      </tbody>
    </table>
  );
}

/** The strain of a sample, which opens what was drawn for it and what that comes to. */
function StrainOf({ share, strain, working }: OpenedSamples['strains'][number]) {
  const figure = percentFromRatio(strain).toFixed(3);
  const lines = working.flatMap((section) => section.lines);
  if (lines.length === 0) return figure;
  return (
    <WorkingPopover
      title={`strain that ${shareWords({ share })} of the samples do not pass`}
      lines={lines}
    >
      {figure}
    </WorkingPopover>
  );
}

function Drawn({ samples }: { readonly samples: OpenedSamples }) {
  const governs = governingWords(samples);
  return (
    <>
      <div className="mt-2">
        <Shares {...samples} />
      </div>
      <Strains {...samples} />
      {governs !== null && <p className="mt-2 text-small">{governs}</p>}
      <p className="mt-1 text-small font-semibold">{settledWords(samples.sensitivity)}</p>
      <p className="mt-1 text-small">{SAMPLES_CAUTION}</p>
      <div className="mt-2">
        <Facts facts={drawnFromWords(samples)} />
      </div>
    </>
  );
}

/** The likely inputs of a building drawn together many times, where somebody asks for it. */
export function SamplesPanel({ seed, onDraw, samples, isDrawing, hasFailed }: SamplesPanelProps) {
  const isShown = samples !== null;
  return (
    <Panel
      title="Sampled run"
      note={isShown ? seedWords(samples) : 'on demand'}
      className={isShown ? '' : 'print:hidden'}
    >
      <p className="mt-2 text-small text-ink-2">{SAMPLES_PURPOSE}</p>
      {isShown && <Drawn samples={samples} />}
      <p role="status" className="text-small text-ink-2">
        {isDrawing ? 'Drawing samples…' : ''}
      </p>
      {hasFailed && (
        <p role="alert" className="mt-2 text-small text-clay-deep">
          The samples could not be drawn. Everything else on this sheet stands.
        </p>
      )}
      <Button
        className="mt-2 print:hidden"
        busy={isDrawing}
        onClick={() => {
          onDraw(seed === null ? FIRST_SEED : seedAfter(seed));
        }}
      >
        {seed === null ? `Draw ${SAMPLES} samples` : 'Other seed'}
      </Button>
    </Panel>
  );
}
