import type { ReactNode } from 'react';

export type State = 'not-started' | 'in-hand' | 'waiting' | 'visit' | 'done';

/** The words that go with a shape unless the screen has better ones. */
const WORDS: Readonly<Record<State, string>> = {
  'not-started': 'Not started',
  'in-hand': 'In hand',
  waiting: 'Waiting for check',
  visit: 'Visit needed',
  done: 'Done',
};

const RING = <circle cx="5.5" cy="5.5" r="4.5" className="fill-none stroke-current" />;

const SHAPES: Readonly<Record<State, ReactNode>> = {
  'not-started': <g className="text-ink-3">{RING}</g>,
  'in-hand': (
    <g>
      {RING}
      <path d="M5.5 1a4.5 4.5 0 0 1 0 9z" className="fill-current" />
    </g>
  ),
  waiting: <path d="M5.5 .8 10.2 5.5 5.5 10.2 .8 5.5z" className="fill-clay-wash stroke-clay" />,
  visit: <path d="M2 1v9M1 1.5h8l-2 2.4 2 2.4H2" className="fill-none stroke-current" />,
  done: <rect x="1" y="1" width="9" height="9" className="fill-current" />,
};

/** The shape of a state alone, where its word stands elsewhere in the row. */
export function StateShape({ state }: { readonly state: State }) {
  return (
    <svg
      width="11"
      height="11"
      strokeWidth="1.35"
      aria-hidden="true"
      className="flex-none text-ink"
    >
      {SHAPES[state]}
    </svg>
  );
}

/** How far something is: shape and word together. */
export function StateMark({
  state,
  children = WORDS[state],
}: {
  readonly state: State;
  readonly children?: ReactNode;
}) {
  return (
    <span className="inline-flex items-center gap-1.5 align-middle whitespace-nowrap">
      <StateShape state={state} />
      {children}
    </span>
  );
}
