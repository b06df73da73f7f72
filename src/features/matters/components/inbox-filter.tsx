import { MATTER_KINDS, MATTER_STATES } from '../../../../shared/schemas/matters.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { InboxFilter } from '../inbox-filter.ts';

type InboxFilterProps = {
  readonly filter: InboxFilter;
  readonly onChange: (change: Partial<InboxFilter>) => void;
};

const STATES = [
  ...MATTER_STATES.map((value) => ({ value, label: capital(value) })),
  { value: 'all' as const, label: 'All' },
];
const KINDS = MATTER_KINDS.map((value) => ({ value, label: capital(value) }));

/** Which matters are shown. */
export function InboxFilterBar({ filter, onChange }: InboxFilterProps) {
  return (
    <div
      role="search"
      aria-label="Matters"
      className="mb-4 flex flex-wrap items-end gap-x-4 gap-y-2"
    >
      <Segments
        label="State"
        segments={STATES}
        value={filter.state}
        onChange={(state) => {
          onChange({ state });
        }}
      />
      <Select
        label="Kind"
        frameClassName="w-36"
        options={KINDS}
        unchosen="Any"
        value={filter.kind}
        onChange={({ target }) => {
          onChange({ kind: target.value });
        }}
      />
      <Field
        label="Words"
        type="search"
        frameClassName="w-56 max-sm:w-full"
        placeholder="Title, text, name, building"
        value={filter.text}
        onChange={({ target }) => {
          onChange({ text: target.value });
        }}
      />
      <div className="flex gap-4">
        <Checkbox
          label="Given to me"
          checked={filter.mine}
          onChange={({ target }) => {
            onChange({ mine: target.checked });
          }}
        />
        <Checkbox
          label="Late"
          checked={filter.overdue}
          onChange={({ target }) => {
            onChange({ overdue: target.checked });
          }}
        />
      </div>
    </div>
  );
}
