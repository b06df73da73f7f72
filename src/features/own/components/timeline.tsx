import { classNames } from '../../../lib/class-names.ts';
import type { Step } from '../timeline-of.ts';

const DOTS: Readonly<Record<Step['state'], string>> = {
  done: 'border-ink bg-ink',
  now: 'border-clay bg-clay ring-4 ring-clay-wash',
  next: 'border-ink bg-paper',
};

const SAID: Readonly<Record<Step['state'], string>> = {
  done: 'Done: ',
  now: 'Next: ',
  next: '',
};

/** What was, what is next and what is to come, down a line. */
export function Timeline({ steps }: { readonly steps: readonly Step[] }) {
  return (
    <section className="mt-5">
      <h2 className="mb-2 text-h2">What happens, and when</h2>
      {steps.length === 0 && (
        <p className="text-lead text-ink-2">No days are set yet. They will stand here.</p>
      )}
      <ol>
        {steps.map(({ when, title, words, state }, k) => (
          <li
            key={k}
            className="relative grid grid-cols-[22px_124px_minmax(0,1fr)] gap-x-1 pb-3 text-lead leading-snug not-last:before:absolute not-last:before:top-2.5 not-last:before:-bottom-1.5 not-last:before:left-1.5 not-last:before:border-l not-last:before:border-rule max-sm:grid-cols-[22px_96px_minmax(0,1fr)]"
          >
            <i
              aria-hidden="true"
              className={classNames(
                'z-1 mt-1 size-[13px] rounded-[50%] border-2 [print-color-adjust:exact]',
                DOTS[state],
              )}
            />
            <span className="pr-2 text-ink-2">{when}</span>
            <span>
              <b className="block font-semibold">
                <span className="sr-only">{SAID[state]}</span>
                {title}
              </b>
              {words !== '' && <span className="block text-ink-2">{words}</span>}
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
