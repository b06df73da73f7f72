import { useId, type ComponentProps } from 'react';
import { BUILDING_WORDS, type BuildingField } from '../../../../shared/schemas/building-fields.ts';
import { Field } from '../../../components/ui/field.tsx';
import { factsOf } from '../../../../shared/presentation/field-words.ts';

type AttributeFieldProps = Omit<ComponentProps<typeof Field>, 'label' | 'unit' | 'list'> & {
  readonly field: BuildingField;
  /** What the field is for is written beside it already. */
  readonly isNamed?: boolean;
  /** Words to offer in place of the usual. */
  readonly words?: readonly string[] | undefined;
};

/** The field that one value of a building is written in, with the words that are usual. */
export function AttributeField(props: AttributeFieldProps) {
  const { field, isNamed = false, words = BUILDING_WORDS[field], ...input } = props;
  const id = useId();
  const { label, kind, unit } = factsOf(field);
  return (
    <>
      <Field
        label={isNamed ? <span className="sr-only">{label}</span> : label}
        {...(unit !== undefined && { unit })}
        {...(kind !== 'text' && { inputMode: 'decimal' })}
        {...(words !== undefined && { list: id })}
        autoComplete="off"
        {...input}
      />
      {words !== undefined && (
        <datalist id={id}>
          {words.map((word) => (
            <option key={word} value={word} />
          ))}
        </datalist>
      )}
    </>
  );
}
