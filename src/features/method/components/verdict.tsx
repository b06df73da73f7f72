import { classNames } from '../../../lib/class-names.ts';

/** Whether a figure agrees, as a mark and a word; what differs stands out. */
export function Verdict({ agrees }: { readonly agrees: boolean }) {
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 whitespace-nowrap',
        !agrees && 'border border-clay bg-clay-wash px-1.5 font-bold text-clay-deep',
      )}
    >
      <svg
        width="10"
        height="10"
        aria-hidden="true"
        fill="none"
        strokeWidth="1.6"
        className="flex-none stroke-current"
      >
        <path d={agrees ? 'M1 5.5 4 8.5 9 1.5' : 'M1.5 1.5l7 7M8.5 1.5l-7 7'} />
      </svg>
      {agrees ? 'agrees' : 'differs'}
    </span>
  );
}
