import type { Category } from '../../../../shared/damage/categories.ts';
import { crackCaption } from '../../../../shared/presentation/owner-words.ts';

/** How wide each crack is drawn, where the nail's 26 stand for its 11 mm. */
const WIDTHS: readonly number[] = [0.6, 1.2, 11, 24];
const LINE = 'M24 -4C27 12 21 20 26 30S32 46 28 56 34 74 31 100';

function Fingernail() {
  return (
    <g transform="translate(110 48)" className="stroke-clay-line">
      <path d="M-22 26V-2C-22-19-11-28 0-28S22-19 22-2V26" className="fill-clay-wash" />
      <path d="M-13 10V-4C-13-15-7-20 0-20S13-15 13-4V10C8 14-8 14-13 10Z" className="fill-sheet" />
    </g>
  );
}

/** A crack as wide as it may become, beside a fingernail; nothing where that helps nobody. */
export function CrackPicture({ category }: { readonly category: Category | null }) {
  const caption = crackCaption(category);
  if (caption === null) return null;
  return (
    <figure className="my-4 flex items-center border border-hairline bg-sheet max-sm:w-full sm:w-[340px]">
      <svg viewBox="0 0 150 96" aria-hidden="true" className="h-24 flex-none">
        <path
          d={LINE}
          fill="none"
          className="stroke-ink-2"
          strokeWidth={WIDTHS[category ?? 0] ?? 1}
        />
        <Fingernail />
      </svg>
      <figcaption className="pr-3 text-lead text-ink-2">{caption}</figcaption>
    </figure>
  );
}
