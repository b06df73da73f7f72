import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { ImportDraft } from '../hooks/use-import-draft.ts';

type LayerSectionProps = { readonly answer: ImportAnswer; readonly draft: ImportDraft };

/** Which of several layers of the file is read. */
export function LayerSection({ answer, draft }: LayerSectionProps) {
  const { layer, layers } = answer;
  return (
    <Panel title="Which layer is read">
      <div className="pt-3">
        <Select
          label="Layer"
          hint="Another is read anew, with columns of its own."
          frameClassName="max-w-[360px]"
          options={layers.map((name) => ({ value: name, label: name }))}
          value={draft.options.layer ?? layer ?? ''}
          disabled={draft.isSending}
          onChange={({ target }) => {
            draft.chooseNow({ layer: target.value });
          }}
        />
      </div>
    </Panel>
  );
}
