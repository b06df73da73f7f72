import { Field } from '../../../components/ui/field.tsx';
import type { Faults, LayoutDraft } from '../layout-draft.ts';

export type DraftProps = {
  readonly draft: LayoutDraft;
  readonly faults: Faults;
  readonly onChange: (change: Partial<LayoutDraft>) => void;
};

/** The parts of a draft that are written as text. */
type TextName = {
  [Name in keyof LayoutDraft]: LayoutDraft[Name] extends string ? Name : never;
}[keyof LayoutDraft];

type DraftFieldProps = DraftProps & {
  readonly name: TextName;
  readonly label: string;
  readonly unit?: string;
  readonly hint?: string;
};

/** A figure of a layout, with what is wrong with it. */
export function DraftField({ draft, faults, onChange, name, ...field }: DraftFieldProps) {
  return (
    <Field
      {...field}
      value={draft[name]}
      error={faults[name]}
      onChange={({ target }) => {
        onChange({ [name]: target.value });
      }}
    />
  );
}
