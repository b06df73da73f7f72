import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { agreement, type ChecksDone } from '../checks/run-checks.ts';
import { useChecks } from '../checks/use-checks.ts';
import { CheckTable } from './check-table.tsx';
import { MethodSection } from './method-section.tsx';

function Count({ done }: { readonly done: ChecksDone }) {
  const { agreeing, all } = agreement(done.checks);
  const differing = all - agreeing;
  return (
    <p role="status" className="mt-3 text-roomy">
      <b className="font-semibold">
        {agreeing} of {all} agree
      </b>
      {differing > 0 && (
        <b className="font-semibold text-clay-deep">
          {' '}
          · {differing} {differing === 1 ? 'differs' : 'differ'}: do not rely on this version
        </b>
      )}
      <span className="text-small text-ink-2">
        {' '}
        · {done.checks.length} checks in {Math.max(1, Math.round(done.milliseconds))} ms, in this
        browser, by version {done.methodVersion} of the method
      </span>
    </p>
  );
}

/** The checks of the method against something outside it, run as the page is opened. */
export function ChecksSection() {
  const { done, isRunning, hasFailed, runAgain } = useChecks();
  return (
    <MethodSection
      id="checks"
      title="Checks"
      note="computed just now beside what is published"
      action={
        <Button className="print:hidden" busy={isRunning} onClick={runAgain}>
          Run again
        </Button>
      }
    >
      {hasFailed && (
        <div className="mt-3">
          <ErrorNote
            failed="The checks did not run."
            stands="Nothing is said of the method. Run them again."
          />
        </div>
      )}
      {done === null && isRunning && (
        <p role="status" className="mt-3 text-ink-2">
          Running the checks.
        </p>
      )}
      {done !== null && (
        <div aria-busy={isRunning}>
          <Count done={done} />
          {done.checks.map((check) => (
            <CheckTable key={check.id} check={check} />
          ))}
        </div>
      )}
    </MethodSection>
  );
}
