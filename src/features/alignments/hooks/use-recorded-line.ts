import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import type { RunDetail } from '../../../../shared/schemas/runs.ts';
import { runContoursQuery } from '../../runs/api/get-run-contours.ts';
import { runQuery } from '../../runs/api/get-run.ts';
import type { LineShape } from '../../map/map-line.ts';
import { shapesOfContours } from '../line-shapes.ts';
import type { ChosenOption } from './use-chosen-option.ts';

const NOTHING: readonly LineShape[] = [];

function isAsRun({ design }: RunDetail, option: AlignmentAnswer | null): boolean {
  return option === null || JSON.stringify(option.design) === JSON.stringify(design);
}

/**
 * The run that is shown, and what it recorded of the line: `record` is null where the line has changed since
 * and nobody asked for that run, since its contours would then lie beside the line.
 */
export function useRecordedLine(
  schemeId: string,
  { run, option, isNamed }: Pick<ChosenOption, 'run' | 'option' | 'isNamed'>,
  isEditing: boolean,
) {
  const runId = run?.id ?? '';
  const detail = useQuery({ ...runQuery(schemeId, runId), enabled: run !== null });
  const known = run === null ? undefined : detail.data;
  const isAsIs = known !== undefined && isAsRun(known, option);
  const record = known !== undefined && !isEditing && (isNamed || isAsIs) ? known : null;
  const drawn = useQuery({ ...runContoursQuery(schemeId, runId), enabled: record !== null });
  const data = record === null ? undefined : drawn.data;
  const contours = useMemo(() => (data === undefined ? NOTHING : shapesOfContours(data)), [data]);
  const failed = run !== null && [detail, drawn].find(({ isError }) => isError);
  return {
    record,
    contours,
    detail: known ?? null,
    hasChanged: known !== undefined && !isAsIs,
    /** Nothing is known yet of what will be shown. */
    isPending: run !== null && !isEditing && detail.isPending,
    failed: failed === false ? undefined : failed,
  };
}

export type RecordedLine = ReturnType<typeof useRecordedLine>;
