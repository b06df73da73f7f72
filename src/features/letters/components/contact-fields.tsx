import { Field } from '../../../components/ui/field.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import type { PartProps } from '../settings-draft.ts';

const FIELDS = [
  ['name', 'Name'],
  ['email', 'E-mail'],
  ['phone', 'Telephone'],
  ['hours', 'Hours'],
] as const;

/** Whom owners may ask. */
export function ContactFields({ draft: { contact }, faults, onChange }: PartProps) {
  return (
    <Panel title="Whom owners ask">
      <div className="grid grid-cols-2 gap-3 pt-3 max-sm:grid-cols-1">
        {FIELDS.map(([name, label]) => (
          <Field
            key={name}
            label={label}
            value={contact[name]}
            error={faults[`contact.${name}`]}
            onChange={(event) => {
              onChange({ contact: { ...contact, [name]: event.target.value } });
            }}
          />
        ))}
        <TextArea
          label="Address, as on an envelope"
          value={contact.address}
          error={faults['contact.address']}
          onChange={(event) => {
            onChange({ contact: { ...contact, address: event.target.value } });
          }}
        />
      </div>
    </Panel>
  );
}
