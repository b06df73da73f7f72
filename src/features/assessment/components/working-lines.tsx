import type { WorkingLine } from '../../../../shared/working.ts';
import { Formula, FiguresPutIn, SymbolName } from '../formula/formula.tsx';
import { sourceInFull } from '../../../../shared/presentation/source-words.ts';
import { sourceNote } from '../../../../shared/presentation/source-note.ts';
import { peoplesFigure, resultWords } from '../../../../shared/presentation/working-words.ts';

/** What came out of a line, and the same as people read it. */
export function Result({ line }: { readonly line: WorkingLine }) {
  const people = peoplesFigure(line);
  return (
    <>
      <b className="font-semibold whitespace-nowrap">{resultWords(line)}</b>
      {people !== null && (
        <>
          {' '}
          <span className="whitespace-nowrap text-ink-2">= {people}</span>
        </>
      )}
    </>
  );
}

/** Where a line is from, in few words; the title says it in full. */
export function Source({ line: { reference } }: { readonly line: WorkingLine }) {
  return <span title={sourceInFull(reference)}>{sourceNote(reference)}</span>;
}

function Line({ line }: { readonly line: WorkingLine }) {
  const { symbol, expression, inputs, meaning } = line;
  return (
    <li className="grid gap-x-5 gap-y-1 border-b border-hairline py-2 md:grid-cols-[minmax(150px,1fr)_minmax(0,3fr)_minmax(150px,1fr)] print:grid-cols-[110px_minmax(0,1fr)_124px] print:gap-x-3 print:break-inside-avoid">
      <div className="text-small">
        <SymbolName name={symbol} />
        <p className="text-cap text-ink-2">{meaning}</p>
      </div>
      <div className="grid min-w-0 gap-y-1 py-0.5 print:text-small">
        <div>
          <Formula symbol={symbol} expression={expression} />
        </div>
        <div>
          <FiguresPutIn expression={expression} figures={inputs} />
        </div>
      </div>
      <div className="text-small md:text-right print:text-right">
        <Result line={line} />
        <p className="text-cap text-ink-2">
          <Source line={line} />
        </p>
      </div>
    </li>
  );
}

/** Lines of a working in full: formula, the figures put into it, what came out and where it is from. */
export function WorkingLines({ lines }: { readonly lines: readonly WorkingLine[] }) {
  return (
    <ol>
      {lines.map((line, index) => (
        <Line key={index} line={line} />
      ))}
    </ol>
  );
}
