import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { importsPath, planPath, registerPath } from '../../../config/paths.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { UndoImport } from './undo-import.tsx';

type Counts = NonNullable<ImportAnswer['counts']>;

function broughtIn({ new: fresh, changed, conflict }: Counts): string {
  const parts = [
    ...(fresh > 0 ? [`${formatCount(fresh)} new`] : []),
    ...(changed + conflict > 0 ? [`${formatCount(changed + conflict)} changed`] : []),
  ];
  return `Brought in: ${parts.length === 0 ? 'nothing' : parts.join(', ')}.`;
}

function Done({ answer }: { readonly answer: ImportAnswer }) {
  const scheme = useScheme();
  return (
    <div role="status" className="border border-rule bg-sheet px-4 py-3">
      <p className="mb-2.5 text-lead font-semibold">
        <StateMark state="done">
          {answer.counts === null ? 'Brought in.' : broughtIn(answer.counts)}
        </StateMark>
      </p>
      <div className="flex flex-wrap items-center gap-2">
        <ButtonLink kind="main" to={planPath(scheme.id)}>
          See them on the plan
        </ButtonLink>
        <ButtonLink to={registerPath(scheme.id)}>Open the register</ButtonLink>
        {answer.changeId !== null && <UndoImport changeId={answer.changeId} />}
      </div>
    </div>
  );
}

/** How an import ended: done, given up or not possible, and what to do then. */
export function ImportEnd({ answer }: { readonly answer: ImportAnswer }) {
  const scheme = useScheme();
  if (answer.state === 'done') return <Done answer={answer} />;
  const another = <ButtonLink to={importsPath(scheme.id)}>Bring in a file</ButtonLink>;
  if (answer.state === 'failed') {
    return (
      <ErrorNote
        failed="This file was not brought in."
        stands={`${answer.fault ?? 'The server stopped at it.'} The register is as it was.`}
        action={another}
      />
    );
  }
  return (
    <div role="status" className="border border-rule bg-sheet px-4 py-3">
      <p className="mb-2.5 text-body">Cancelled. The register is as it was.</p>
      {another}
    </div>
  );
}
