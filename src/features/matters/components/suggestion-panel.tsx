import { useState, type SubmitEvent } from 'react';
import type { KeptSuggestion, Matter } from '../../../../shared/schemas/matter-answers.ts';
import { MATTER_LIMITS } from '../../../../shared/schemas/matters.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { faultsOfError } from '../../../lib/faults-by-path.ts';
import { useMatterStep } from '../api/change-matter.ts';
import { suggestionWords } from '../matter-words.ts';

const THANKS = 'Thank you. We have put this right in our records.';

type TakeOverProps = {
  readonly schemeId: string;
  readonly matter: Matter;
  readonly onReload: () => void;
  readonly onClose: () => void;
};

function TakeOver({ schemeId, matter, onReload, onClose }: TakeOverProps) {
  const [text, setText] = useState(THANKS);
  const [id] = useState(() => crypto.randomUUID());
  const step = useMatterStep(schemeId, matter.id, onClose);
  function take(event: SubmitEvent) {
    event.preventDefault();
    const { version, building } = matter;
    const message = { id, text };
    const body = { version, buildingVersion: building.version, message };
    step.mutate({ kind: 'take over', body });
  }
  const faults = faultsOfError(step.error);
  return (
    <Dialog open title="Take it over into the register" onClose={onClose}>
      <form onSubmit={take} noValidate className="grid gap-3">
        <MutationError
          failed="Nothing was taken over."
          error={step.error}
          shown={['message.text']}
          action={<Button onClick={onReload}>See what is new</Button>}
        />
        <p className="text-body">
          The register changes at once, the owner is told, and the matter is closed. What the
          register said stays in its history.
        </p>
        <TextArea
          label="Answer to the owner"
          data-first-in-focus
          maxLength={MATTER_LIMITS.text}
          value={text}
          error={faults['message.text']}
          onChange={({ target }) => {
            setText(target.value);
          }}
        />
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={step.isPending}>
            Take it over
          </Button>
          <Button onClick={onClose}>Leave it as it is</Button>
        </div>
      </form>
    </Dialog>
  );
}

type SuggestionPanelProps = Omit<TakeOverProps, 'onClose'> & {
  readonly suggestion: KeptSuggestion;
  readonly mayTake: boolean;
};

/** What an owner says that the register should say. */
export function SuggestionPanel({ suggestion, mayTake, ...props }: SuggestionPanelProps) {
  const [asks, setAsks] = useState(false);
  const isOpen = !suggestion.isTakenOver && props.matter.building.isInRegister;
  return (
    <Panel title="Suggested for the register">
      <p className="mt-2 text-body break-words" dir="auto">
        {suggestionWords(suggestion)}
      </p>
      {suggestion.isTakenOver && <p className="mt-1 text-small text-ink-2">Taken over.</p>}
      {isOpen && mayTake && (
        <Button
          className="mt-2"
          onClick={() => {
            setAsks(true);
          }}
        >
          Take it over…
        </Button>
      )}
      {asks && (
        <TakeOver
          {...props}
          onClose={() => {
            setAsks(false);
          }}
        />
      )}
    </Panel>
  );
}
