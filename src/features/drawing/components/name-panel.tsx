import { useState, type SubmitEvent } from 'react';
import { buildingReferenceSchema } from '../../../../shared/schemas/building-fields.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useMedia } from '../../../hooks/use-media.ts';
import { ApiError } from '../../../lib/api-error.ts';
import type { ShapeDraft } from '../drafts/draft.ts';
import { useNextReference } from '../hooks/use-next-reference.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';
import { CornerTable } from './corner-table.tsx';
import { FigureLine } from './figure-line.tsx';
import { GiveUp } from './give-up.tsx';
import { MoreRings } from './more-rings.tsx';
import { PanelFrame } from './panel-frame.tsx';
import { RightAngles } from './right-angles.tsx';

const FORM = 'new-building';

/** What the server holds against the reference. */
function referenceFault(error: Error | null): string | undefined {
  if (!(error instanceof ApiError)) return undefined;
  return error.fields.find(({ path }) => path === 'reference')?.message;
}

type NamePanelProps = {
  readonly drawing: PlanDrawing;
  readonly draft: ShapeDraft;
  /** What was written as its reference; null while the proposed one stands. */
  readonly written: string | null;
  readonly onWrite: (reference: string) => void;
};

/** A new building whose outline is closed: what it is called, and saving it. */
export function NamePanel({ drawing, draft, written, onWrite }: NamePanelProps) {
  const { drafting, saving, save, schemeId } = drawing;
  const proposed = useNextReference(schemeId);
  const [fault, setFault] = useState<string | undefined>(undefined);
  // a finger would get a keyboard over what it has drawn
  const isByFinger = useMedia('(pointer: coarse)');
  const reference = written ?? proposed ?? '';

  function submit(event: SubmitEvent): void {
    event.preventDefault();
    const parsed = buildingReferenceSchema.safeParse(reference);
    setFault(parsed.error?.issues[0]?.message);
    if (parsed.success) save(parsed.data);
  }
  return (
    <PanelFrame
      title="Draw a building"
      hint="The outline is closed. Drag corners to mend it, then save."
      actions={
        <>
          <Button kind="main" type="submit" form={FORM} busy={saving.isPending}>
            Save the building
          </Button>
          <GiveUp press={drawing.press} />
        </>
      }
    >
      <MutationError
        failed="The building was not saved."
        error={saving.error}
        shown={['reference']}
      />
      <dl>
        <FigureLine label="Area in plan" value={areaWords(draft.parts)} />
      </dl>
      <form id={FORM} noValidate onSubmit={submit} className="mt-2.5">
        <Field
          label="Reference"
          hint="Values can be written once it is saved."
          autoComplete="off"
          autoFocus={!isByFinger}
          value={reference}
          error={fault ?? referenceFault(saving.error)}
          onChange={({ target }) => {
            onWrite(target.value);
          }}
        />
      </form>
      <div className="mt-2">
        <RightAngles square={drawing.square} />
      </div>
      <MoreRings drafting={drafting} />
      <CornerTable draft={draft} chosen={drafting.chosen} onEdit={drafting.editShape} />
    </PanelFrame>
  );
}
