import { Formula, SymbolName } from '../../assessment/formula/formula.tsx';
import { sourceNote } from '../../../../shared/presentation/source-note.ts';
import { sourceInFull } from '../../../../shared/presentation/source-words.ts';
import type { MethodFormula, MethodPart } from '../formulas/formula-parts.ts';
import { symbolsOf } from '../formulas/method-parts.ts';

function FormulaRow({ formula }: { readonly formula: MethodFormula }) {
  const { symbol, expression, meaning, unit, reference } = formula;
  return (
    <li className="grid items-center gap-x-5 border-b border-hairline py-2 sm:grid-cols-[minmax(0,1fr)_190px] print:grid-cols-[minmax(0,1fr)_150px] print:break-inside-avoid">
      <div className="min-w-0 py-1">
        <Formula symbol={symbol} expression={expression} />
      </div>
      <div className="text-small">
        {meaning}
        {unit !== '' && <span className="text-ink-2">, {unit}</span>}
        <p className="text-cap text-ink-2" title={sourceInFull(reference)}>
          {sourceNote(reference)}
        </p>
      </div>
    </li>
  );
}

function Symbols({ part }: { readonly part: MethodPart }) {
  const symbols = symbolsOf(part);
  if (symbols.length === 0) return null;
  return (
    <details className="mt-2" open>
      <summary className="text-small font-semibold max-sm:py-2">Symbols</summary>
      <table className="mt-1 w-full text-small" aria-label={`Symbols: ${part.title}`}>
        <thead className="sr-only">
          <tr>
            <th scope="col">Symbol</th>
            <th scope="col">Meaning</th>
            <th scope="col">Unit</th>
          </tr>
        </thead>
        <tbody className="lg:columns-1">
          {symbols.map(({ symbol, meaning, unit }) => (
            <tr key={symbol} className="border-b border-hairline align-baseline">
              <th scope="row" className="w-16 py-1 pr-3 text-left font-normal">
                <SymbolName name={symbol} />
              </th>
              <td className="py-1 pr-3">{meaning}</td>
              <td className="w-24 py-1 text-right whitespace-nowrap text-ink-2">{unit}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}

/** A part of the method: what it does, its formulas, their symbols and how far they hold. */
export function FormulaPart({ part }: { readonly part: MethodPart }) {
  const { id, title, words, formulas, limits } = part;
  return (
    <section id={id} aria-labelledby={`${id}-name`} className="mt-6 scroll-mt-4">
      <h3 id={`${id}-name`} className="text-h3">
        {title}
      </h3>
      <p className="mt-1 max-w-[84ch] text-ink-2">{words}</p>
      <div className="mt-2 grid gap-x-10 gap-y-2 xl:grid-cols-[minmax(0,5fr)_minmax(280px,3fr)] print:block">
        <div className="min-w-0">
          <div
            role="region"
            aria-label={`Formulas: ${title}`}
            tabIndex={0}
            className="overflow-x-auto border-t border-rule print:overflow-visible"
          >
            <ol>
              {formulas.map((formula) => (
                <FormulaRow key={`${formula.symbol} ${formula.expression}`} formula={formula} />
              ))}
            </ol>
          </div>
          <ul className="mt-2 max-w-[84ch] list-disc pl-4 text-small text-ink-2">
            {limits.map((limit) => (
              <li key={limit} className="py-0.5">
                {limit}
              </li>
            ))}
          </ul>
        </div>
        <Symbols part={part} />
      </div>
    </section>
  );
}
