import { Fragment } from 'react';

const ADDRESS = /(https?:\/\/\S+)/;

/** A letter's words as they were written; addresses can be pressed. */
export function LetterText({ text }: { readonly text: string }) {
  return (
    <div
      tabIndex={0}
      role="region"
      aria-label="The letter as text"
      className="max-h-[min(560px,70vh)] overflow-auto border border-rule bg-sheet px-5 py-4 text-body break-words whitespace-pre-wrap"
    >
      {text.split(ADDRESS).map((piece, index) =>
        ADDRESS.test(piece) ? (
          <a key={index} href={piece} target="_blank" rel="noopener noreferrer">
            {piece}
          </a>
        ) : (
          <Fragment key={index}>{piece}</Fragment>
        ),
      )}
    </div>
  );
}
