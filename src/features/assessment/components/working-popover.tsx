import type { WorkingLine } from '../../../../shared/working.ts';
import { Popover } from '../../../components/ui/popover.tsx';
import { formatSignificant } from '../../../../shared/presentation/significant.ts';
import { Formula, SymbolName } from '../formula/formula.tsx';
import { originOf, workingText } from '../../../../shared/presentation/working-words.ts';
import { CopyButton } from './copy-button.tsx';
import { Result, Source } from './working-lines.tsx';

type WorkingPopoverProps = {
  /** What was worked out, as "strain of wall b". */
  readonly title: string;
  /** The last line gives the figure; the ones before it are how it came about. */
  readonly lines: readonly WorkingLine[];
  /** Lines from further up, which say where the figures come from. */
  readonly before?: readonly WorkingLine[];
  /** The figure, as it stands on the page. */
  readonly children: string;
};

function PutIn({
  line,
  before,
}: {
  readonly line: WorkingLine;
  readonly before: readonly WorkingLine[];
}) {
  return (
    <table className="w-full text-small" aria-label={`What ${line.symbol} is worked out from`}>
      <tbody>
        {Object.entries(line.inputs).map(([name, value]) => (
          <tr key={name} className="align-baseline">
            <th scope="row" className="py-0.5 pr-2 text-left font-normal">
              <SymbolName name={name} />
            </th>
            <td className="py-0.5 pr-3 text-right whitespace-nowrap">
              {formatSignificant(value, 5)}
            </td>
            <td className="py-0.5 text-cap text-ink-2">{originOf(name, before)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Step({
  line,
  before,
}: {
  readonly line: WorkingLine;
  readonly before: readonly WorkingLine[];
}) {
  return (
    <div className="border-t border-hairline py-2">
      <div
        role="group"
        aria-label={`Formula: ${line.meaning}`}
        tabIndex={0}
        className="overflow-x-auto pb-1"
      >
        <Formula symbol={line.symbol} expression={line.expression} />
      </div>
      <PutIn line={line} before={before} />
      <p className="mt-1 border-t border-ink pt-1 text-small">
        <SymbolName name={line.symbol} /> <Result line={line} />
      </p>
      <p className="text-cap text-ink-2">
        {line.meaning}; <Source line={line} />
      </p>
    </div>
  );
}

/** A figure with a fine line under it, which opens its working beside it. */
export function WorkingPopover({ title, lines, before = [], children }: WorkingPopoverProps) {
  return (
    <Popover
      name={`${children}, working of the ${title}`}
      button={children}
      className="inline-flex"
      buttonClassName="border-b border-ink-3 leading-snug hover:border-clay hover:text-clay-deep print:border-0"
      wide
    >
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 pb-1">
        <p className="text-body font-semibold">Working: {title}</p>
        <CopyButton textOf={() => workingText(title, lines)}>Copy as text</CopyButton>
      </div>
      {lines.map((line, index) => (
        <Step key={index} line={line} before={[...before, ...lines.slice(0, index)]} />
      ))}
    </Popover>
  );
}
