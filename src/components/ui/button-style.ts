import { classNames } from '../../lib/class-names.ts';

export type ButtonKind = 'main' | 'plain' | 'quiet';

const SHAPE =
  'inline-flex h-[30px] items-center justify-center gap-1.5 rounded border text-small leading-none ' +
  'font-medium whitespace-nowrap no-underline cursor-pointer max-sm:h-11 max-sm:text-body ' +
  'aria-disabled:cursor-default';

const KINDS: Readonly<Record<ButtonKind, string>> = {
  main: 'border-ink bg-ink px-3 text-ink-on-dark hover:bg-ink-2 aria-disabled:bg-ink-3',
  plain: 'border-control bg-paper-raised px-3 text-ink hover:bg-paper-sunk hover:border-ink',
  quiet: 'border-transparent px-1.5 text-clay-deep underline underline-offset-2 hover:text-ink',
};

/** The look of everything that is pressed: one main a screen, plain for the rest, quiet beside text. */
export function buttonStyle(kind: ButtonKind, extra?: string): string {
  return classNames(SHAPE, KINDS[kind], extra);
}
