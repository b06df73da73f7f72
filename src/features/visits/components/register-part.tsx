import { useState } from 'react';
import { VISITED_FIELDS, type VisitedField } from '../../../../shared/schemas/visits.ts';
import { factsOf, formatFigure } from '../../../../shared/presentation/field-words.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { AttributeField } from '../../buildings/components/attribute-field.tsx';
import type { SeenBuilding } from '../draft/kept-visit.ts';
import type { VisitDraft } from '../hooks/use-visit-draft.ts';

const LOOKED_AT: readonly VisitedField[] = ['condition', 'construction'];
const OTHERS = VISITED_FIELDS.filter((field) => !LOOKED_AT.includes(field));

function registerWords(field: VisitedField, seen: SeenBuilding): string {
  const value = seen.values[field] ?? null;
  if (value === null) return 'In the register: not known';
  if (typeof value === 'string') return `In the register: ${value}`;
  const { unit } = factsOf(field);
  return `In the register: ${formatFigure(field, value)}${unit === undefined ? '' : ` ${unit}`}`;
}

type FieldsProps = { readonly draft: VisitDraft; readonly fields: readonly VisitedField[] };

function Fields({ draft, fields }: FieldsProps) {
  const { seen, findings } = draft.visit;
  return (
    <div className="mt-2 grid grid-cols-2 gap-x-4 gap-y-3 max-sm:grid-cols-1">
      {fields.map((field) => (
        <AttributeField
          key={field}
          field={field}
          {...(seen !== null && { hint: registerWords(field, seen) })}
          value={findings.texts[field] ?? ''}
          onChange={({ target }) => {
            draft.changeText(field, target.value);
          }}
        />
      ))}
    </div>
  );
}

/** What the building is found to be, beside what the register has; what is left empty stays as it is. */
export function RegisterPart({ draft }: { readonly draft: VisitDraft }) {
  const { seen, findings } = draft.visit;
  const [isOpen, setOpen] = useState(OTHERS.some((field) => findings.texts[field]));
  return (
    <Panel title="What it is" note="what you leave empty stays as it is">
      {seen === null && (
        <p className="mt-2 text-small text-ink-2">
          The register cannot be reached. What you write is kept with the visit; the register stays
          as it is.
        </p>
      )}
      <Fields draft={draft} fields={LOOKED_AT} />
      {seen !== null && (
        <details
          open={isOpen}
          onToggle={({ currentTarget }) => {
            setOpen(currentTarget.open);
          }}
          className="mt-2"
        >
          <summary className="flex min-h-11 cursor-pointer items-center text-small text-clay-deep underline">
            Put other values of the register right
          </summary>
          <Fields draft={draft} fields={OTHERS} />
        </details>
      )}
    </Panel>
  );
}
