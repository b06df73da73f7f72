import { useState, type SubmitEvent } from 'react';
import { CATEGORIES, type Category } from '../../../../shared/damage/categories.ts';
import {
  DECISION_KINDS,
  DECISION_TEXT,
  type DecisionKind,
} from '../../../../shared/schemas/decisions.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { KIND_WORDS } from '../../../../shared/presentation/decision-words.ts';

/** What is to be decided, as it is written in the form. */
export type Proposal = {
  readonly kind: DecisionKind;
  readonly category: Category | null;
  readonly reason: string;
};

export const NOTHING_PROPOSED: Proposal = {
  kind: 'let go at stage 1',
  category: null,
  reason: '',
};

type DecideFormProps = {
  readonly draft: Proposal;
  /** Why a kind cannot be had, where there is one building. */
  readonly whyNot?: (kind: DecisionKind) => string | null;
  readonly needsReason?: (kind: DecisionKind) => boolean;
  /** What pressing the button does. */
  readonly doIt?: string;
  readonly busy?: boolean;
  readonly onPropose: (proposal: Proposal) => void;
  readonly onClose: () => void;
};

const KINDS = DECISION_KINDS.map((kind) => ({ value: kind, label: KIND_WORDS[kind] }));
const CLASSES = CATEGORIES.map(({ category, label, name }) => ({
  value: String(category),
  label: `${label} ${name}`,
}));

function isKind(text: string): text is DecisionKind {
  return DECISION_KINDS.some((kind) => kind === text);
}

function CategorySelect({
  category,
  error,
  onChoose,
}: {
  readonly category: Category | null;
  readonly error: string | undefined;
  readonly onChoose: (category: Category | null) => void;
}) {
  return (
    <Select
      label="Category"
      options={CLASSES}
      unchosen="Choose"
      value={category === null ? '' : String(category)}
      error={error}
      onChange={({ target }) => {
        const row = CATEGORIES.find((one) => String(one.category) === target.value);
        onChoose(row?.category ?? null);
      }}
    />
  );
}

/** What is decided, and why. */
export function DecideForm(props: DecideFormProps) {
  const { draft, whyNot = () => null, needsReason = () => false, onPropose, onClose } = props;
  const { doIt = 'Look at it first', busy = false } = props;
  const [proposal, setProposal] = useState(draft);
  const [isTried, setTried] = useState(false);
  const { kind, category, reason } = proposal;
  const why = whyNot(kind);
  const isCategoryMissing = kind === 'adopt a category' && category === null;
  const isReasonMissing = needsReason(kind) && reason.trim() === '';

  function propose(event: SubmitEvent) {
    event.preventDefault();
    setTried(true);
    if (why !== null || isCategoryMissing || isReasonMissing) return;
    onPropose({ ...proposal, category: kind === 'adopt a category' ? category : null });
  }
  return (
    <form onSubmit={propose} noValidate className="grid gap-3">
      <Select
        label="Decision"
        options={KINDS}
        value={kind}
        error={isTried && why !== null ? why : undefined}
        hint={why ?? undefined}
        data-first-in-focus
        onChange={({ target }) => {
          if (isKind(target.value)) setProposal({ ...proposal, kind: target.value });
        }}
      />
      {kind === 'adopt a category' && (
        <CategorySelect
          category={category}
          error={isTried && isCategoryMissing ? 'Say which category is adopted.' : undefined}
          onChoose={(chosen) => {
            setProposal({ ...proposal, category: chosen });
          }}
        />
      )}
      <TextArea
        label="Reason"
        hint="Read by whoever checks it, and at an inquiry."
        rows={3}
        maxLength={DECISION_TEXT}
        value={reason}
        error={isTried && isReasonMissing ? 'Say why.' : undefined}
        onChange={({ target }) => {
          setProposal({ ...proposal, reason: target.value });
        }}
      />
      <div className="flex gap-2">
        <Button kind="main" type="submit" busy={busy}>
          {doIt}
        </Button>
        <Button onClick={onClose}>Leave it</Button>
      </div>
    </form>
  );
}
