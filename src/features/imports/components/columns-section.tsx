import { IMPORT_FIELDS, type ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Field } from '../../../components/ui/field.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { unusedColumns, withColumn } from '../field-words.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import { ColumnLine } from './column-line.tsx';
import { UnusedColumns } from './unused-columns.tsx';

type ColumnsSectionProps = { readonly answer: ImportAnswer; readonly draft: ImportDraft };

/** Footprints without a reference of their own get numbers. */
function Numbering({ draft }: Pick<ColumnsSectionProps, 'draft'>) {
  const { prefix } = draft.options;
  return (
    <Field
      label="Number the buildings with"
      hint={`No column holds a reference, so they are called ${prefix}1, ${prefix}2 and so on. A later file cannot tell which is which.`}
      frameClassName="max-w-[360px]"
      maxLength={20}
      value={prefix}
      onChange={({ target }) => {
        draft.choose({ prefix: target.value });
      }}
    />
  );
}

function rememberedWords({ at, fileName }: NonNullable<ImportAnswer['remembered']>): string {
  return `As chosen on ${formatDay(at)} for ${fileName}, which has the same columns.`;
}

/** Which column of the file fills which field of the register. */
export function ColumnsSection({ answer, draft }: ColumnsSectionProps) {
  const { columns } = draft.options;
  const rows = answer.counts?.rows ?? answer.progress.of;
  const hasReference = columns.reference !== undefined;
  return (
    <Panel
      title="Which column is what"
      note={answer.remembered !== null && rememberedWords(answer.remembered)}
    >
      <ul className="border-b border-hairline">
        {IMPORT_FIELDS.map((field) => (
          <ColumnLine
            key={field}
            field={field}
            columns={answer.columns}
            rows={rows}
            value={columns[field] ?? ''}
            onChange={(column) => {
              draft.choose({ columns: withColumn(columns, field, column) });
            }}
          />
        ))}
      </ul>
      <div className="grid grid-cols-1 gap-3 pt-3">
        {!hasReference && answer.kind === 'footprints' && <Numbering draft={draft} />}
        {!hasReference && answer.kind === 'values' && (
          <p className="text-small font-medium text-clay-deep">
            Say which column holds the reference: the values are joined to buildings by it.
          </p>
        )}
        <UnusedColumns columns={unusedColumns(answer.columns, columns)} />
      </div>
    </Panel>
  );
}
