import { useQuery } from '@tanstack/react-query';
import type { LetterKind } from '../../../../shared/schemas/letter-settings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { registerViewsQuery } from '../../register/api/list-views.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { KIND_OPTIONS } from '../letter-words.ts';
import { ruleWords } from '../rule-words.ts';
import type { RuleDraft } from '../settings-draft.ts';

/** In metres, as is common. */
const SHAFT_WITHIN = '30';
const NO_PLACE = { name: '', east: '', north: '', metres: '30' };

type RuleFieldsProps = {
  readonly rule: RuleDraft;
  readonly place: string;
  readonly faults: Readonly<Record<string, string>>;
  readonly onChange: (rule: RuleDraft) => void;
  readonly onRemove: () => void;
};

/** A place in the grid, as a work site, that buildings have to be near to. */
function NearFields({ rule, place, faults, onChange }: Omit<RuleFieldsProps, 'onRemove'>) {
  const { near } = rule;
  if (near === null) return null;
  const fields = [
    ['name', 'Name of the place', undefined],
    ['east', 'Easting', 'm'],
    ['north', 'Northing', 'm'],
    ['metres', 'Within', 'm'],
  ] as const;
  return (
    <div className="col-span-full grid grid-cols-4 gap-3 max-sm:grid-cols-2">
      {fields.map(([name, label, unit]) => (
        <Field
          key={name}
          label={label}
          unit={unit}
          value={near[name]}
          error={faults[`${place}.near.${name}`]}
          onChange={(event) => {
            onChange({ ...rule, near: { ...near, [name]: event.target.value } });
          }}
        />
      ))}
    </div>
  );
}

/** How near a building has to be to a shaft; shafts are kept with the line. */
function ShaftField({ rule, place, faults, onChange }: Omit<RuleFieldsProps, 'onRemove'>) {
  if (rule.shaftWithin === null) return null;
  return (
    <div className="col-span-full grid grid-cols-4 gap-3 max-sm:grid-cols-2">
      <Field
        label="Within, of a shaft"
        unit="m"
        hint="Shafts are kept with the line, on the plan"
        value={rule.shaftWithin}
        error={faults[`${place}.shaftWithin`]}
        onChange={(event) => {
          onChange({ ...rule, shaftWithin: event.target.value });
        }}
      />
    </div>
  );
}

/** What narrows a rule. */
function Only({ rule, onChange }: Pick<RuleFieldsProps, 'rule' | 'onChange'>) {
  return (
    <>
      <Checkbox
        label="Listed buildings only"
        checked={rule.listedOnly}
        onChange={(event) => {
          onChange({ ...rule, listedOnly: event.target.checked });
        }}
      />
      <Checkbox
        label="Near a shaft of the line only"
        checked={rule.shaftWithin !== null}
        onChange={(event) => {
          onChange({ ...rule, shaftWithin: event.target.checked ? SHAFT_WITHIN : null });
        }}
      />
      <Checkbox
        label="Near a place only, as a work site"
        checked={rule.near !== null}
        onChange={(event) => {
          onChange({ ...rule, near: event.target.checked ? NO_PLACE : null });
        }}
      />
    </>
  );
}

/** Which buildings a rule means is taken from a kept view of the register, an outline on its map too. */
function Which({ rule, onChange }: Pick<RuleFieldsProps, 'rule' | 'onChange'>) {
  const { data: views = [] } = useQuery(registerViewsQuery(useScheme().id));
  const words = ruleWords({ ...rule, near: null, shaftWithin: null });
  return (
    <div className="col-span-full text-small">
      <p>
        <span className="text-ink-2">Buildings: </span>
        {words}
      </p>
      {views.length === 0 ? (
        <p className="text-ink-3">
          To mean others, filter the register, or draw an outline on the plan, and keep it as a
          view.
        </p>
      ) : (
        <Select
          label="Take which buildings from a kept view"
          unchosen="Leave as it is"
          value=""
          options={views.map(({ id, name }) => ({ value: id, label: name }))}
          onChange={(event) => {
            const view = views.find(({ id }) => id === event.target.value);
            if (view !== undefined) onChange({ ...rule, filter: view.filter });
          }}
        />
      )}
    </div>
  );
}

/** One rule of who gets which letter. */
export function RuleFields(props: RuleFieldsProps) {
  const { rule, place, faults, onChange, onRemove } = props;
  const text = (name: 'why' | 'source' | 'date', label: string, type = 'text') => (
    <Field
      label={label}
      type={type}
      value={rule[name]}
      error={faults[`${place}.${name}`]}
      onChange={(event) => {
        onChange({ ...rule, [name]: event.target.value });
      }}
    />
  );
  return (
    <li className="grid grid-cols-2 gap-3 border-b border-rule py-3 max-sm:grid-cols-1">
      <Select
        label="Letter"
        options={KIND_OPTIONS}
        value={rule.kind}
        onChange={(event) => {
          onChange({ ...rule, kind: event.target.value as LetterKind });
        }}
      />
      {text('why', 'Why, as the record says it')}
      {text('source', 'Source')}
      {text('date', 'Since', 'date')}
      <Which {...{ rule, onChange }} />
      <NearFields {...props} />
      <ShaftField {...props} />
      <div className="col-span-full flex flex-wrap items-center gap-x-5 gap-y-1">
        <Only {...{ rule, onChange }} />
        <Checkbox
          label="Holds"
          checked={rule.isOn}
          onChange={(event) => {
            onChange({ ...rule, isOn: event.target.checked });
          }}
        />
        <Button kind="quiet" onClick={onRemove}>
          Take the rule out
        </Button>
      </div>
    </li>
  );
}
