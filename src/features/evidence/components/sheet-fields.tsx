import { PAPER_NAMES } from '../../../../shared/schemas/evidence.ts';
import { Segments } from '../../../components/ui/segments.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { chosen, KINDS, ROWS, SCALES } from '../evidence-words.ts';
import { ofKind } from '../layout-draft.ts';
import { DraftField, type DraftProps } from './draft-field.tsx';

const PAPERS = PAPER_NAMES.map((value) => ({ value, label: value }));

/** The scale of what is printed: those in use, or any other. */
export function ScaleField({ draft, faults, onChange }: DraftProps) {
  return (
    <div>
      <DraftField {...{ draft, faults, onChange }} name="denominator" label="Scale 1 :" />
      <div className="mt-1 flex flex-wrap gap-x-3 text-small">
        {SCALES.map((scale) => (
          <button
            key={scale}
            type="button"
            className="min-h-6 underline max-sm:min-h-11"
            onClick={() => {
              onChange({ denominator: scale });
            }}
          >
            1 : {scale}
          </button>
        ))}
      </div>
    </div>
  );
}

/** The paper that is printed on: what the kind allows. */
export function PaperField({ draft, faults, onChange }: DraftProps) {
  const papers = draft.kind === 'schedule' ? PAPERS.slice(0, 2) : PAPERS;
  return (
    <Select
      label="Paper"
      options={papers}
      value={draft.paper}
      error={faults.paper}
      onChange={({ target }) => {
        const paper = chosen(papers, target.value);
        if (paper !== undefined) onChange({ paper });
      }}
    />
  );
}

/** What is printed, on which paper and to which scale. */
export function SheetFields(props: DraftProps) {
  const { draft, onChange } = props;
  return (
    <div className="grid gap-3">
      <div>
        <Segments
          label="What is printed"
          segments={KINDS}
          value={draft.kind}
          onChange={(kind) => {
            onChange(ofKind(draft, kind));
          }}
        />
      </div>
      <div className="grid grid-cols-2 items-start gap-3">
        <PaperField {...props} />
        {draft.kind === 'schedule' ? (
          <Select
            label="Buildings"
            options={ROWS}
            value={draft.rows}
            onChange={({ target }) => {
              const rows = chosen(ROWS, target.value);
              if (rows !== undefined) onChange({ rows });
            }}
          />
        ) : (
          <ScaleField {...props} />
        )}
      </div>
    </div>
  );
}
