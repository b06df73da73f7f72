import { ToolButton } from '../../drawing/components/tool-button.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { TOOLS } from '../../drawing/tools.ts';
import type { PlanLine } from '../hooks/use-plan-line.ts';

const LINE_TOOL = {
  id: 'line',
  name: 'Edit the line',
  key: 'A',
  path: 'M2 13.5C6 13.5 6 5 10 5s3 6.5 6.5 6.5M2 13.5h.1M16.4 11.5h.1',
};

type LineToolsProps = {
  readonly line: PlanLine;
  /** The tools for buildings stand there too. */
  readonly isBeside: boolean;
};

/** The line tool, and undo and redo while it is at work. */
export function LineTools({ line, isBeside }: LineToolsProps) {
  const { mayEdit, mayBegin, editor, edit, isBusyElsewhere, isKnown } = line;
  if (!mayEdit || !isKnown) return null;
  const { isEditing, drafting } = editor;
  const { past, future } = drafting.steps;
  return (
    <div
      role="group"
      aria-label="Draw the line"
      className={classNames(
        'flex p-[3px] max-md:border-t max-md:border-ink max-md:bg-paper-raised md:absolute md:top-[126px]',
        'md:w-fit md:flex-col md:rounded md:border md:border-rule md:bg-paper-raised md:shadow-lift',
        isBeside ? 'md:left-[56px]' : 'md:left-3',
      )}
    >
      <ToolButton
        tool={LINE_TOOL}
        isOn={isEditing}
        reason={isBusyElsewhere ? 'Save what you change of a building, or leave it, first.' : null}
        onPress={() => {
          if (mayBegin) edit();
        }}
      />
      {isEditing && (
        <>
          {TOOLS.filter(({ id }) => id === 'undo' || id === 'redo').map((tool) => {
            const isUndo = tool.id === 'undo';
            const none = isUndo ? 'Nothing to take back here.' : 'Nothing was taken back.';
            return (
              <ToolButton
                key={tool.id}
                tool={tool}
                isOn={false}
                reason={(isUndo ? past : future) > 0 ? null : none}
                onPress={isUndo ? drafting.undo : drafting.redo}
              />
            );
          })}
        </>
      )}
    </div>
  );
}
