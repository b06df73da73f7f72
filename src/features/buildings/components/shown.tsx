import { classNames } from '../../../lib/class-names.ts';
import type { ShownValue } from '../../../../shared/presentation/shown-value.ts';

/** A value of a building: assumed ones over dotted clay, unknown ones a quiet dash, each saying why. */
export function Shown({ shown }: { readonly shown: ShownValue }) {
  if (shown.kind === 'unknown') {
    return (
      <span title={shown.why} className="text-ink-3">
        <span aria-hidden="true">–</span>
        <span className="sr-only">not known</span>
      </span>
    );
  }
  const { kind, text, why } = shown;
  return (
    <span
      title={why ?? text}
      className={classNames(
        kind === 'assumed' && 'border-b-[1.5px] border-dotted border-clay text-ink-2',
        kind === 'follows' && 'text-ink-3',
      )}
    >
      {text}
      {kind !== 'known' && (
        <span className="sr-only"> ({kind === 'assumed' ? 'assumed' : why})</span>
      )}
    </span>
  );
}
