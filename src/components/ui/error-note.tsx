import type { ReactNode } from 'react';

type ErrorNoteProps = {
  /** What failed. */
  readonly failed: string;
  /** What still stands. */
  readonly stands?: string | undefined;
  /** What to do, as words or a button. */
  readonly action?: ReactNode;
};

/** Something went wrong: what failed, what still stands, what to do. */
export function ErrorNote({ failed, stands, action }: ErrorNoteProps) {
  return (
    <div role="alert" className="border-l-4 border-clay bg-clay-wash px-3 py-2.5 text-body">
      <p>
        <b className="font-semibold">{failed}</b>
        {stands === undefined ? '' : ` ${stands}`}
      </p>
      {action !== undefined && <div className="mt-2">{action}</div>}
    </div>
  );
}
