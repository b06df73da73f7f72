import { Segments } from '../../../components/ui/segments.tsx';
import type { ImportDraft } from '../hooks/use-import-draft.ts';

const WAYS = [
  { value: 'ask', label: 'As for the others' },
  { value: 'keep ours', label: 'Keep ours' },
  { value: 'take theirs', label: 'Take theirs' },
] as const;

type Way = (typeof WAYS)[number]['value'];

type SettleRowProps = { readonly reference: string; readonly draft: ImportDraft };

/** Settles what changed on both sides, for one building. */
export function SettleRow({ reference, draft }: SettleRowProps) {
  const { settle } = draft.options;

  function choose(way: Way): void {
    const others = Object.entries(settle.rows).filter(([name]) => name !== reference);
    const rows = Object.fromEntries(way === 'ask' ? others : [...others, [reference, way]]);
    draft.choose({ settle: { ...settle, rows } });
  }
  return (
    <Segments
      label={`Where both changed, for ${reference}`}
      segments={WAYS}
      value={settle.rows[reference] ?? 'ask'}
      onChange={choose}
    />
  );
}
