import type { RegisterColumn } from '../../../../shared/schemas/register.ts';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Chevron } from '../../../components/ui/chevron.tsx';
import { Popover } from '../../../components/ui/popover.tsx';
import { factsOf } from '../../../../shared/presentation/field-words.ts';
import { CHOOSABLE } from '../register-columns.ts';

type ColumnChooserProps = {
  readonly columns: readonly RegisterColumn[];
  readonly onChoose: (columns: readonly RegisterColumn[]) => void;
};

/** Which columns are shown; their order is fixed. */
export function ColumnChooser({ columns, onChoose }: ColumnChooserProps) {
  return (
    <Popover
      name="Columns"
      button={
        <>
          Columns <Chevron />
        </>
      }
      buttonClassName={buttonStyle('plain')}
    >
      <ul>
        {CHOOSABLE.map((column) => (
          <li key={column}>
            <Checkbox
              label={factsOf(column).label}
              checked={columns.includes(column)}
              onChange={({ target }) => {
                const others = columns.filter((one) => one !== column);
                onChoose(target.checked ? [...others, column] : others);
              }}
            />
          </li>
        ))}
      </ul>
    </Popover>
  );
}
