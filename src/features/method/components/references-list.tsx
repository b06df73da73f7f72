import { REFERENCES, type ReferenceKey } from '../../../../shared/references.ts';
import { sourceInFull } from '../../../../shared/presentation/source-words.ts';

/** What is no printed work. */
const NOT_CITED: readonly string[] = ['own', 'common-practice'] satisfies ReferenceKey[];

function isCited(key: string): key is ReferenceKey {
  return key in REFERENCES && !NOT_CITED.includes(key);
}

/** Every cited work in full. */
export function ReferencesList() {
  const keys = Object.keys(REFERENCES).filter(isCited);
  return (
    <>
      <p className="mt-2 max-w-[84ch] text-small text-ink-2">
        Bibliographic data were set down from memory and are to be confirmed against the printed
        work before they are quoted. What is marked “worked out here” is this project’s own; “common
        practice, no source” is used in the trade without one.
      </p>
      <ul className="mt-1 text-small">
        {keys.map((key) => (
          <li
            key={key}
            id={`source-${key}`}
            className="max-w-[110ch] border-b border-hairline py-1.5"
          >
            {sourceInFull(key)}
          </li>
        ))}
      </ul>
    </>
  );
}
