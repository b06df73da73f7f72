import { useQuery } from '@tanstack/react-query';
import { useState, type SubmitEvent } from 'react';
import {
  EVIDENCE_LIMITS,
  type EvidenceLayout,
  type LayoutAnswer,
} from '../../../../shared/schemas/evidence.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { ConflictChoice } from '../../../components/ui/conflict-choice.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { changesBetween } from '../../../lib/changes-between.ts';
import { layoutsQuery, useKeepLayout, useRemoveLayout } from '../api/layouts.ts';

type LayoutBarProps = {
  readonly schemeId: string;
  readonly kept: LayoutAnswer | null;
  readonly layout: EvidenceLayout | null;
  readonly hasEdits: boolean;
  readonly mayKeep: boolean;
  readonly onOpen: (layout: LayoutAnswer | null) => void;
  readonly onKept: (layout: LayoutAnswer) => void;
};

function seenOf({ name, layout }: Pick<LayoutAnswer, 'name' | 'layout'>) {
  return { name, ...layout };
}

/** Somebody else kept the layout meanwhile: what they changed, and a way to go on. */
function Conflict({
  seen,
  now,
  onKeepMine,
}: {
  readonly seen: LayoutAnswer;
  readonly now: LayoutAnswer | undefined;
  readonly onKeepMine: (now: LayoutAnswer) => void;
}) {
  if (now === undefined || now.version === seen.version) return null;
  return (
    <ConflictChoice
      changes={changesBetween(seenOf(seen), seenOf(now))}
      onKeepMine={() => {
        onKeepMine(now);
      }}
    />
  );
}

function Keep(props: LayoutBarProps & { readonly layouts: readonly LayoutAnswer[] }) {
  const { schemeId, kept, layout, hasEdits, layouts, onKept } = props;
  const [name, setName] = useState(kept?.name ?? '');
  const named = name.trim();
  // another name makes another layout
  const seen = kept !== null && named === kept.name ? kept : null;
  const keep = useKeepLayout(schemeId, seen, onKept);
  const isConflict = seen !== null && isRefusal(keep.error, 'conflict');
  function save(event: SubmitEvent) {
    event.preventDefault();
    if (layout !== null && named !== '') keep.mutate({ name: named, layout });
  }
  const now = layouts.find(({ id }) => id === kept?.id);
  return (
    <form onSubmit={save} className="grid gap-2">
      <Field
        label="Name of the layout"
        maxLength={EVIDENCE_LIMITS.name}
        value={name}
        error={
          keep.error !== null && isRefusal(keep.error, 'validation')
            ? keep.error.fields.find(({ path }) => path === 'name')?.message
            : undefined
        }
        onChange={({ target }) => {
          setName(target.value);
        }}
      />
      <MutationError
        failed="The layout was not kept."
        error={keep.error}
        shown={['name']}
        action={
          isConflict && (
            <Conflict
              seen={seen}
              now={now}
              onKeepMine={(newest) => {
                onKept(newest);
                keep.reset();
              }}
            />
          )
        }
      />
      {layout !== null && named !== '' && (seen === null || hasEdits) && (
        <Button type="submit" className="justify-self-start" busy={keep.isPending}>
          {seen === null ? 'Keep as a new layout' : 'Keep the layout'}
        </Button>
      )}
    </form>
  );
}

function Remove({
  schemeId,
  kept,
  onGone,
}: {
  readonly schemeId: string;
  readonly kept: LayoutAnswer;
  readonly onGone: () => void;
}) {
  const [isAsked, setAsked] = useState(false);
  const remove = useRemoveLayout(schemeId, () => {
    setAsked(false);
    onGone();
  });
  return (
    <>
      <Button
        kind="quiet"
        onClick={() => {
          setAsked(true);
        }}
      >
        Remove it
      </Button>
      <ConfirmDialog
        open={isAsked}
        title={`Remove the layout “${kept.name}”?`}
        doIt="Remove the layout"
        busy={remove.isPending}
        onConfirm={() => {
          remove.mutate(kept.id);
        }}
        onClose={() => {
          setAsked(false);
        }}
      >
        <p>What was printed from it stays.</p>
        <MutationError failed="The layout was not removed." error={remove.error} />
      </ConfirmDialog>
    </>
  );
}

/** The named layouts of a scheme: open one, keep what stands, or remove one. */
export function LayoutBar(props: LayoutBarProps) {
  const { schemeId, kept, mayKeep, onOpen } = props;
  const { data: layouts = [] } = useQuery(layoutsQuery(schemeId));
  return (
    <div className="grid gap-2">
      {layouts.length > 0 && (
        <div className="flex items-end gap-2">
          <Select
            label="Named layout"
            unchosen="A new layout"
            frameClassName="min-w-0 flex-1"
            options={layouts.map(({ id, name }) => ({ value: id, label: name }))}
            value={kept?.id ?? ''}
            onChange={({ target }) => {
              onOpen(layouts.find(({ id }) => id === target.value) ?? null);
            }}
          />
          {mayKeep && kept !== null && (
            <Remove
              {...{ schemeId, kept }}
              onGone={() => {
                onOpen(null);
              }}
            />
          )}
        </div>
      )}
      {mayKeep && <Keep key={kept?.id ?? 'new'} {...props} layouts={layouts} />}
    </div>
  );
}
