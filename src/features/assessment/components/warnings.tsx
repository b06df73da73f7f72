import { WARNINGS, type Warning } from '../../../../shared/warnings.ts';

function isWarning(name: string): name is Warning {
  return name in WARNINGS;
}

/** What a reader must know to use a figure, each with what it means. */
export function Warnings({ names }: { readonly names: readonly string[] }) {
  if (names.length === 0) return null;
  return (
    <ul className="mt-2 text-small" aria-label="Warnings">
      {names.map((name) => (
        <li key={name} className="border-l-4 border-clay-line bg-clay-wash px-2.5 py-1 [&+&]:mt-1">
          <b className="inline-block font-semibold first-letter:uppercase">{name}.</b>{' '}
          {isWarning(name) ? WARNINGS[name] : ''}
        </li>
      ))}
    </ul>
  );
}
