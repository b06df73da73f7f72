import type { ReactNode, Ref } from 'react';

type ErrorNoteProps = {
  /** What failed. */
  readonly failed: string;
  /** What still stands. */
  readonly stands?: string | undefined;
  /** What to do, as words or a button. */
  readonly action?: ReactNode;
  /** To bring it into view and focus. */
  readonly ref?: Ref<HTMLDivElement>;
};

/** Something went wrong: what failed, what still stands, what to do. */
export function ErrorNote({ failed, stands, action, ref }: ErrorNoteProps) {
  return (
    <div
      ref={ref}
      role="alert"
      tabIndex={-1}
      className="border-l-4 border-clay bg-clay-wash px-3 py-2.5 text-body"
    >
      <p>
        <b className="font-semibold">{failed}</b>
        {stands === undefined ? '' : ` ${stands}`}
      </p>
      {action !== undefined && <div className="mt-2">{action}</div>}
    </div>
  );
}
