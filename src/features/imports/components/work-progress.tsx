import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Progress } from '../../../components/ui/progress.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { IMPORT_STATE_WORDS } from '../import-states.ts';

/** How far the server is with an import. */
export function WorkProgress({ answer }: { readonly answer: ImportAnswer }) {
  const { words } = IMPORT_STATE_WORDS[answer.state];
  const { done, of } = answer.progress;
  if (of === null) {
    return (
      <p role="status" className="text-small">
        <b className="font-semibold">{words}</b>{' '}
        <span className="text-ink-2">{formatCount(done)} rows so far</span>
      </p>
    );
  }
  const unit = answer.state === 'importing' ? 'buildings' : 'rows';
  return <Progress label={words} done={done} total={of} unit={unit} />;
}
