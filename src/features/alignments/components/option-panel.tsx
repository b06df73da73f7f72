import { RunOption } from '../../runs/components/run-option.tsx';
import { Button } from '../../../components/ui/button.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import type { PlanLine } from '../hooks/use-plan-line.ts';
import { optionLines } from '../option-changes.ts';
import { FaultLine } from './range-fields.tsx';
import { OptionActions } from './option-actions.tsx';

type OptionPanelProps = { readonly line: PlanLine };

/** An option in figures, and what may be done with it. */
function ShownOption({
  line,
  option,
}: OptionPanelProps & { readonly option: NonNullable<PlanLine['option']> }) {
  const { mayBegin, edit, choose, fault, runs, recorded } = line;
  function show(): void {
    choose(option.id);
  }
  return (
    <>
      <h2 className="text-h3 break-words">{option.name}</h2>
      <p className="mt-1 text-small text-ink-2">
        Changed {formatShortDay(option.changedAt)}
        {option.changedBy === null ? '' : ` by ${option.changedBy}`}.
      </p>
      <FaultLine>{fault === null ? undefined : `No settlement is shown. ${fault}`}</FaultLine>
      <RunOption key={option.id} option={option} hasRuns={runs.length > 0} onStarted={show} />
      <dl className="mt-2">
        {optionLines(option)
          .slice(1)
          .map(([label, value]) => (
            <div key={label} className="border-b border-hairline py-1 text-small">
              <dt className="text-cap text-ink-3">{label}</dt>
              <dd className="break-words">{value}</dd>
            </div>
          ))}
      </dl>
      <p className="mt-2 text-small text-ink-2">
        Contours are settlement at the surface at the central values, in mm
        {recorded.record === null
          ? ': an estimate, worked out here and not recorded.'
          : `, as run ${recorded.record.number} recorded it.`}
      </p>
      {mayBegin && (
        <OptionActions key={option.id} option={option} onEdit={edit} onChoose={choose} />
      )}
    </>
  );
}

/** The option that is shown on the map. */
export function OptionPanel({ line }: OptionPanelProps) {
  const { option, options, mayBegin, isKnown, draw } = line;
  if (!isKnown || (option === null && !mayBegin && options.length === 0)) return null;
  return (
    <section aria-label="Line" className="mt-5 border-t border-ink pt-3">
      {option === null ? (
        <>
          <h2 className="text-h3">Line</h2>
          <p className="mt-1 text-small text-ink-2">
            {options.length === 0
              ? 'No line yet. Draw one to see its settlement.'
              : 'No option is shown.'}
          </p>
        </>
      ) : (
        <ShownOption {...{ line, option }} />
      )}
      {mayBegin && (
        <div className="mt-2">
          <Button kind={options.length === 0 ? 'main' : 'plain'} onClick={draw}>
            {options.length === 0 ? 'Draw the line' : 'Draw another option'}
          </Button>
        </div>
      )}
    </section>
  );
}
