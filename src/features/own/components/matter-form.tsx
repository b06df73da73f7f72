import { useEffect, useId, useRef, type SubmitEvent } from 'react';
import { MATTER_LIMITS, type MatterKind } from '../../../../shared/schemas/matters.ts';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { useMatterForm, type MatterDraft } from '../hooks/use-matter-form.ts';
import { FORM_WORDS, workingDays } from '../own-words.ts';
import { CorrectionFields } from './correction-fields.tsx';
import { PhotographList } from './photograph-list.tsx';

type MatterFormProps = {
  readonly buildingId: number;
  readonly kind: MatterKind;
  /** In how many working days an answer comes. */
  readonly answerDays: number;
  readonly onDone: (matter: OwnMatter) => void;
  readonly onClose: () => void;
};

function Fields({ kind, draft }: { readonly kind: MatterKind; readonly draft: MatterDraft }) {
  const words = FORM_WORDS[kind];
  const { title, setTitle, text, setText, faults } = draft;
  return (
    <>
      {kind === 'correction' ? (
        <CorrectionFields
          draft={draft.correction}
          error={faults['suggestion.value']}
          onChange={draft.setCorrection}
        />
      ) : (
        <Field
          label={words.about}
          hint={words.aboutHint}
          autoComplete="off"
          frameClassName="mb-3"
          maxLength={MATTER_LIMITS.title}
          value={title}
          error={faults.title}
          onChange={({ target }) => {
            setTitle(target.value);
          }}
        />
      )}
      <TextArea
        label={words.text}
        rows={5}
        maxLength={MATTER_LIMITS.text}
        value={text}
        error={faults.text}
        onChange={({ target }) => {
          setText(target.value);
        }}
      />
      {kind !== 'question' && <PhotographList photographs={draft.photographs} />}
    </>
  );
}

/** Something that an owner brings up. It says what happens next before it is sent. */
export function MatterForm({ buildingId, kind, answerDays, onDone, onClose }: MatterFormProps) {
  const id = useId();
  const form = useRef<HTMLFormElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const draft = useMatterForm(buildingId, kind, onDone);
  const words = FORM_WORDS[kind];
  const { refusals } = draft;
  useEffect(() => {
    const missing = form.current?.querySelector<HTMLElement>('[aria-invalid]');
    if (refusals === 0) heading.current?.focus();
    else missing?.focus();
  }, [refusals]);
  function send(event: SubmitEvent) {
    event.preventDefault();
    draft.send();
  }
  return (
    <form ref={form} noValidate aria-labelledby={id} onSubmit={send}>
      <h2 ref={heading} id={id} tabIndex={-1} className="mb-2 text-h2">
        {words.title}
      </h2>
      <p className="mb-3 max-w-[34em] text-h3 text-ink-2">{words.next(workingDays(answerDays))}</p>
      <Fields kind={kind} draft={draft} />
      <div className="mt-3">
        <MutationError
          failed="It has not been sent."
          error={draft.error}
          stands="What you wrote is still here. Please try again."
          shown={['title', 'text', 'suggestion.value']}
        />
      </div>
      <div className="mt-4 flex flex-wrap gap-2.5">
        <Button type="submit" kind="main" busy={draft.isSending}>
          {words.send}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
