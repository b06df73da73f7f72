import type { ReactNode } from 'react';
import { BasisLine } from '../../../components/layout/basis-line.tsx';
import type { CrsAnswer } from '../../../../shared/schemas/crs.ts';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { OptionMenu } from '../../alignments/components/option-menu.tsx';
import { designParts } from '../../../../shared/presentation/design-words.ts';
import type { PlanLine } from '../../alignments/hooks/use-plan-line.ts';
import { RunExport } from '../../runs/components/run-export.tsx';
import { RunInputs } from '../../runs/components/run-inputs.tsx';
import { RunMenu } from '../../runs/components/run-menu.tsx';
import type { RunView } from '../../runs/hooks/use-run-view.ts';
import { completeOf } from '../../runs/run-states.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';

type PlanBasisProps = {
  readonly scheme: SchemeAnswer;
  readonly crs: CrsAnswer | undefined;
  /** The line that is shown; a page without it says nothing of one. */
  readonly line?: PlanLine;
  /** What of its run is shown. */
  readonly view?: RunView;
  /** A way to print what is shown of its run. */
  readonly print?: ReactNode;
  /** Whose results stand in the register. */
  readonly results?: RunAnswer | undefined;
};

function lineParts(line: PlanLine, print: ReactNode) {
  const { editor, options, design } = line;
  const name = editor.isEditing && (
    <b key="option">{editor.base?.name ?? 'New option'}, being changed</b>
  );
  const menu = options.length > 0 && <OptionMenu key="option" line={line} />;
  const first = name === false ? menu : name;
  return [
    ...(first === false ? [] : [first]),
    ...runParts(line, print),
    ...(design === null ? [] : designParts(design)),
  ];
}

function runParts(
  { runs, run, recorded, chooseRun, option, schemeId }: PlanLine,
  print: ReactNode,
) {
  if (completeOf(runs).length === 0 || (run === null && option === null)) return [];
  const menu = <RunMenu key="run" runs={runs} shown={run} onChoose={chooseRun} />;
  const { detail } = recorded;
  return detail === null
    ? [menu]
    : [
        menu,
        <RunInputs key="inputs" {...{ schemeId }} run={detail} />,
        <RunExport key="export" {...{ schemeId }} run={detail} />,
        ...(print === undefined ? [] : [print]),
      ];
}

/** Which values are shown, or that nothing here is recorded. */
function valueShown({ isPreview, recorded }: PlanLine, view: RunView | undefined) {
  if (isPreview) return <b>Preview, not a run: central settlement</b>;
  if (recorded.record === null) return 'Nothing worked out yet';
  if (view?.by === 'category' && view.end !== 'central') {
    return (
      <>
        Categories at the <b>{view.end}</b> end, contours central
      </>
    );
  }
  return view?.by === 'settlement' ? (
    <>
      Buildings by the <b>largest</b> settlement, contours central
    </>
  ) : (
    <>
      Figures shown at the <b>central</b> value
    </>
  );
}

function resultsWords(run: RunAnswer): string {
  const { option, endedAt } = run;
  const at = endedAt === null ? '' : `, ${formatMoment(endedAt)}`;
  return `${runName(run).toLowerCase()}, ${option.name}, version ${option.version}${at}`;
}

/** What the plan rests on: the option of the line and its values, its run or the register, and the grid. */
export function PlanBasis({ scheme, crs, line, view, print, results }: PlanBasisProps) {
  const grid = crs === undefined ? `EPSG:${scheme.crs}` : `${crs.name}, EPSG:${crs.code}`;
  const isPreview = line?.isPreview === true;
  const isRecorded = line !== undefined && line.recorded.record !== null;
  return (
    <BasisLine
      preview={isPreview || line?.editor.isEditing === true}
      parts={[
        ...(line === undefined ? [] : lineParts(line, print)),
        ...(isRecorded ? [] : [<b key="register">Register as it stands</b>]),
        ...(results === undefined ? [] : [`Results of ${resultsWords(results)}`]),
        ...(isPreview || isRecorded ? [] : [`Grid ${grid}`]),
      ]}
      end={line === undefined ? undefined : valueShown(line, view)}
    />
  );
}
