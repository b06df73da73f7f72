import {
  bracketCategories,
  LOSS_LEVELS,
  type Bracket,
} from '../../../../shared/assessment/bracket.ts';
import { CATEGORIES, type Category } from '../../../../shared/damage/categories.ts';
import {
  atPosition,
  CENTRAL,
  FIVE_POSITIONS,
  isRange,
  type Range,
} from '../../../../shared/numerics/range.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { classNames } from '../../../lib/class-names.ts';
import { hatchTileUrl } from '../../../theme/damage.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';

type BracketTableProps = {
  readonly bracket: Bracket;
  readonly volumeLoss: Range;
  /** Null where K is no input of the depth rule. */
  readonly troughWidth: Range | null;
};

function Cell({
  category,
  strain,
  isCentral,
}: {
  category: Category;
  strain: number;
  isCentral: boolean;
}) {
  return (
    <td className="p-0.5">
      <span
        className={classNames(
          'flex p-1 print:[print-color-adjust:exact]',
          isCentral && 'outline-2 -outline-offset-1 outline-ink',
        )}
        style={{ backgroundImage: `url("${hatchTileUrl(category)}")` }}
      >
        <span className="flex w-full items-baseline justify-between gap-1 bg-sheet px-1 leading-tight">
          <b>
            <span className="sr-only">Category </span>
            {CATEGORIES[category]?.label}
          </b>
          <span className="text-micro">
            {percentFromRatio(strain).toFixed(3)}
            <span className="sr-only"> %</span>
          </span>
        </span>
      </span>
    </td>
  );
}

/** The largest strain at one volume loss and K, whatever the E/G. */
function strainAt({ strains }: Bracket, v: number, k: number): number {
  return Math.max(...strains.map((levels) => levels[v]?.[k] ?? 0));
}

/** Category and strain over the likely range: volume loss downwards, K across; the central one is framed. */
export function BracketTable({ bracket, volumeLoss, troughWidth }: BracketTableProps) {
  const categories = bracketCategories(bracket);
  const varies = troughWidth !== null && isRange(troughWidth);
  const positions = varies ? FIVE_POSITIONS : [CENTRAL];
  return (
    <table
      className="w-full table-fixed text-small"
      aria-label="Category and strain in % over the bracket"
    >
      <thead>
        <tr className="text-cap text-ink-2">
          <th scope="col" className="w-[46px] text-left font-normal">
            <span className="sr-only">Volume loss</span>
          </th>
          {positions.map((k) => (
            <th key={k} scope="col" className="pb-0.5 text-center font-normal">
              {troughWidth !== null && (
                <>
                  {k === positions[0] ? 'K ' : <span className="sr-only">K </span>}
                  {atPosition(troughWidth, k).toFixed(2)}
                </>
              )}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {LOSS_LEVELS.map((level, v) => (
          <tr key={level}>
            <th scope="row" className="text-left text-cap font-normal whitespace-nowrap text-ink-2">
              {percentWords(volumeLoss[level], 2)}
            </th>
            {positions.map((k) => (
              <Cell
                key={k}
                category={categories[v]?.[k] ?? 0}
                strain={strainAt(bracket, v, k)}
                isCentral={level === 'central' && k === CENTRAL}
              />
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
