import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { HatchSwatch } from '../../../components/ui/hatch-swatch.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { bandWords } from '../../../../shared/presentation/settlement-bands.ts';
import { SETTLEMENT_TINTS, STAGE_TINTS } from '../../../../shared/presentation/ground-tints.ts';
import { FIRST_SHADE } from '../../map/shades.ts';
import type { Shading } from '../shades-of-run.ts';

type LegendRow = {
  readonly shade: number;
  readonly swatch: ReactNode;
  /** Stands in the building too. */
  readonly number: string;
  readonly words: string;
};

const STAGE_WORDS: Readonly<Record<number, string>> = {
  2: 'let go: strain small',
  3: 'to be looked at in detail',
};

function Swatch({ colour }: { readonly colour: string }) {
  return (
    <i
      aria-hidden="true"
      className="inline-block h-3.5 w-[22px] flex-none border border-bldg-edge"
      style={{ backgroundColor: colour }}
    />
  );
}

function rowsOf(by: Shading['by']): readonly LegendRow[] {
  if (by === 'category') {
    return CATEGORIES.map(({ category, label, name }) => ({
      shade: FIRST_SHADE.category + category,
      swatch: <HatchSwatch category={category} />,
      number: label,
      words: name,
    }));
  }
  const tints = by === 'stage' ? STAGE_TINTS : SETTLEMENT_TINTS;
  return tints.map(([number, colour]) => ({
    shade: FIRST_SHADE[by] + number,
    swatch: <Swatch colour={colour} />,
    number: by === 'stage' ? String(number) : '',
    words: by === 'stage' ? (STAGE_WORDS[number] ?? '') : bandWords(number),
  }));
}

type LegendRowsProps = {
  readonly by: Shading['by'];
  readonly counts: ReadonlyMap<number, number>;
  /** Where the buildings of a colour are listed; undefined where they are not. */
  readonly listAt: ((shade: number) => string) | undefined;
  /** How many take no colour, and why. */
  readonly others: readonly [count: number, words: string] | null;
};

type CountProps = {
  readonly count: number;
  readonly to: string | undefined;
  readonly words: string;
};

/** How many take a colour; pressed, they are listed. */
function Count({ count, to, words }: CountProps) {
  if (to === undefined || count === 0) return formatCount(count);
  return (
    <Link
      to={to}
      aria-label={`${formatCount(count)} in the register: ${words}`}
      className="underline decoration-rule underline-offset-2 hover:decoration-ink"
    >
      {formatCount(count)}
    </Link>
  );
}

/** What each colour stands for: swatch, number, words, and how many buildings take it. */
export function LegendRows({ by, counts, listAt, others }: LegendRowsProps) {
  return (
    <table className="w-full text-small" aria-label="Colours and how many buildings take each">
      <tbody>
        {rowsOf(by).map(({ shade, swatch, number, words }) => (
          <tr key={shade}>
            <td className="w-[30px] py-[1.5px] align-middle leading-none">{swatch}</td>
            <th scope="row" className="py-[1.5px] text-left font-normal">
              {number !== '' && <b className="inline-block w-8 font-semibold">{number}</b>}
              <span className="inline-block first-letter:uppercase">{words}</span>
            </th>
            <td className="py-[1.5px] pl-3 text-right">
              <Count count={counts.get(shade) ?? 0} to={listAt?.(shade)} words={words} />
            </td>
          </tr>
        ))}
        {others !== null && (
          <tr className="text-ink-2">
            <td className="py-[1.5px] align-middle leading-none">
              <i
                aria-hidden="true"
                className="inline-block h-3.5 w-[22px] border border-bldg-edge bg-bldg"
              />
            </td>
            <th scope="row" className="py-[1.5px] text-left font-normal">
              {others[1]}
            </th>
            <td className="py-[1.5px] pl-3 text-right">{formatCount(others[0])}</td>
          </tr>
        )}
      </tbody>
    </table>
  );
}
