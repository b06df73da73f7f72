import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';

type MendChoiceProps = {
  readonly count: number;
  readonly draft: ImportDraft;
  readonly onShow: () => void;
};

/** Whether outlines that cross themselves are mended, and a way to see them. */
export function MendChoice({ count, draft, onShow }: MendChoiceProps) {
  const many = count !== 1;
  return (
    <div className="flex flex-wrap items-start gap-x-4">
      <Checkbox
        label="Mend crossing outlines"
        hint={`${many ? `${formatCount(count)} outlines cross themselves` : 'One outline crosses itself'} and would be refused. Open such a row to see it before and after.`}
        checked={draft.options.mend}
        onChange={({ target }) => {
          draft.chooseNow({ mend: target.checked });
        }}
      />
      <Button kind="quiet" onClick={onShow}>
        Show {many ? 'them' : 'it'}
      </Button>
    </div>
  );
}
