import type { KeptSuggestion } from '../../../shared/schemas/matter-answers.ts';
import type { MatterState } from '../../../shared/schemas/matters.ts';
import { BUILDING_FIELDS } from '../../../shared/schemas/building-fields.ts';
import type { State } from '../../components/ui/state-mark.tsx';

/** The shape of each state of a matter. */
export const MATTER_SHAPES: Readonly<Record<MatterState, State>> = {
  open: 'waiting',
  answered: 'in-hand',
  closed: 'done',
};

/** A building as people say it: its name or address, else its reference. */
export function placeName({
  reference,
  name,
  address,
}: {
  readonly reference: string;
  readonly name: string | null;
  readonly address?: string | null;
}): string {
  const words = name ?? address ?? null;
  return words === null ? reference : `${reference}, ${words}`;
}

/** What a correction suggests, in a sentence. */
export function suggestionWords({ field, value, was }: KeptSuggestion): string {
  const { label } = BUILDING_FIELDS[field];
  const before = was === null ? 'The register does not say.' : `The register said “${was}”.`;
  return `${label}: “${value}”. ${before}`;
}
