import type { ImportAnswer } from '../../../shared/schemas/imports.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { countToWrite } from './outcomes.ts';

type Asked = Pick<ImportAnswer, 'kind' | 'missing' | 'counts'>;

/** What the button says, and why it cannot be pressed yet. */
export type Readiness = { readonly label: string; readonly reason: string | null };

function buildings(count: number): string {
  return `${formatCount(count)} ${count === 1 ? 'building' : 'buildings'}`;
}

function missingWords({ missing, counts }: Asked): string | null {
  const conflicts = counts?.conflict ?? 0;
  const words: Readonly<Record<ImportAnswer['missing'][number], string>> = {
    crs: 'Say which system the coordinates are in.',
    reference: 'Say which column holds the reference.',
    columns: 'Say which column is what.',
    settle: `Settle ${conflicts === 1 ? 'the building' : `the ${formatCount(conflicts)} buildings`} that changed here and in the file.`,
  };
  const [first] = missing;
  return first === undefined ? null : words[first];
}

/** Whether a checked import can be brought in. */
export function readinessOf(asked: Asked): Readiness {
  const { kind, counts } = asked;
  const count = counts === null ? 0 : countToWrite(counts);
  const verb = kind === 'values' ? 'Change' : 'Bring in';
  const label = counts === null ? `${verb} buildings` : `${verb} ${buildings(count)}`;
  const nothing =
    counts !== null && count === 0
      ? counts.refused > 0 && counts.same === 0
        ? 'Every row is refused; the report says why.'
        : 'The register has all of it already.'
      : null;
  return { label, reason: missingWords(asked) ?? nothing };
}
