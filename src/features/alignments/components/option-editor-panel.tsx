import type { ReactNode } from 'react';
import { useWatch } from 'react-hook-form';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { AddCorner } from '../../drawing/components/add-corner.tsx';
import { CornerTable } from '../../drawing/components/corner-table.tsx';
import { FigureLine } from '../../drawing/components/figure-line.tsx';
import { PanelFrame } from '../../drawing/components/panel-frame.tsx';
import { addCorner } from '../../drawing/drafts/edit-corners.ts';
import { figure } from '../../../../shared/presentation/design-words.ts';
import { hasFirstValues } from '../drafts/option-draft.ts';
import { finishLine, goOnWithLine, LEAST_POINTS } from '../drafts/line-draft.ts';
import type { OptionEditor } from '../hooks/use-option-editor.ts';
import { lengthOf } from '../option-changes.ts';
import { BoresFields } from './bores-fields.tsx';
import { IntervalRows } from './interval-rows.tsx';
import { LevelRows } from './level-rows.tsx';
import { OptionClash } from './option-clash.tsx';
import { ShaftRows } from './shaft-rows.tsx';
import { FaultLine, RangeFields, type OptionControl } from './range-fields.tsx';

type EditorProps = { readonly editor: OptionEditor };

/** The points of the line in figures. */
function LinePoints({ editor: { drafting, points } }: EditorProps) {
  const { line, chosen, edit } = drafting;
  if (line === null) return null;
  return (
    <details className="mt-3" open={!line.isSet}>
      <summary className="cursor-pointer text-small font-semibold">
        Points of the line <span className="font-normal text-ink-2">{points.length}</span>
      </summary>
      <CornerTable draft={line} chosen={chosen} onEdit={edit} />
      <AddCorner
        what="point"
        onAdd={(place) => {
          edit((now) => addCorner(now, place));
        }}
      />
    </details>
  );
}

function LineActions({ editor: { drafting, points } }: EditorProps) {
  const { line, edit } = drafting;
  if (line?.isSet === true) {
    return (
      <Button
        onClick={() => {
          edit(goOnWithLine);
        }}
      >
        Draw on from the end
      </Button>
    );
  }
  if (points.length < LEAST_POINTS) return null;
  return (
    <Button
      onClick={() => {
        edit(finishLine);
      }}
    >
      End the line{' '}
      <span className="max-sm:hidden">
        <KeyCap>Enter</KeyCap>
      </span>
    </Button>
  );
}

/** Says where the values come from that nobody has written. */
function FirstValues({ control }: { readonly control: OptionControl }) {
  const isFirst = useWatch({ control, compute: hasFirstValues });
  if (!isFirst) return null;
  return (
    <p className="mt-1 text-cap text-clay-deep">
      Common practice to begin with, no source. Write what this ground asks for.
    </p>
  );
}

function OptionFields({ editor }: EditorProps) {
  const { form, save } = editor;
  const { control, register, getValues } = form;
  const { errors } = form.formState;
  const fields = { control, register };
  return (
    <form noValidate aria-label="Values of the option" onSubmit={(event) => void save(event)}>
      <Field label="Name" autoComplete="off" error={errors.name?.message} {...register('name')} />
      <LevelRows {...fields} />
      <BoresFields {...fields} />
      <RangeFields {...fields} of="volumeLoss" />
      <RangeFields {...fields} of="troughWidth" />
      <FirstValues control={control} />
      <IntervalRows {...fields} valuesOf={getValues} />
      <ShaftRows {...fields} />
    </form>
  );
}

function hintOf(isSet: boolean): string {
  return isSet
    ? 'Drag points; drag the middle of a part to make another. A point that is pressed can be deleted.'
    : 'Press the points on the map in the order of driving, or write them here. Press the last one again to end the line.';
}

/** An option while its line is drawn and its values are written. */
export function OptionEditorPanel({
  editor,
  fault,
  action,
}: EditorProps & {
  readonly fault: string | null;
  /** What else can be done with it, or cannot yet. */
  readonly action?: ReactNode;
}) {
  const { base, drafting, points, save, busy, theirs, giveUp, form } = editor;
  const { errors, isSubmitted } = form.formState;
  const lineFault = points.length < LEAST_POINTS ? 'Draw two points at least.' : undefined;
  const faults = Object.keys(errors).length > 0;
  return (
    <PanelFrame
      title={base === null ? 'New option' : `Edit ${base.name}`}
      hint={hintOf(drafting.line?.isSet ?? true)}
      actions={
        <>
          {theirs === null && (
            <Button kind="main" busy={busy} onClick={() => void save()}>
              Save
            </Button>
          )}
          <LineActions editor={editor} />
          <Button onClick={giveUp}>
            Give up{' '}
            <span className="max-sm:hidden">
              <KeyCap>Esc</KeyCap>
            </span>
          </Button>
          {action}
          {faults && (
            <p role="status" className="w-full text-small font-medium text-clay-deep">
              Not saved yet. Mend what is marked.
            </p>
          )}
        </>
      }
    >
      <OptionClash editor={editor} />
      <FaultLine>{fault ?? undefined}</FaultLine>
      {isSubmitted && <FaultLine>{lineFault}</FaultLine>}
      <dl className="mb-2">
        <FigureLine label="Length" value={`${figure(lengthOf(points), 1)} m`} />
      </dl>
      <OptionFields editor={editor} />
      <LinePoints editor={editor} />
    </PanelFrame>
  );
}
