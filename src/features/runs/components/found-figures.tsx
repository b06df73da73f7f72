import type { ReactNode } from 'react';
import type { RunResult } from '../../../../shared/schemas/runs.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';
import { slopeWords } from '../../../../shared/presentation/slope-words.ts';
import { stageWords } from '../../../../shared/presentation/result-words.ts';
import { settlementWords } from '../tip-of-run.ts';

type Line = readonly [word: string, value: ReactNode];

function governedBy({ governingWall, isRow, mode }: RunResult): string | null {
  if (governingWall === null) return null;
  const letter = governingWall.replace(/, row$/, '');
  const wall = `wall ${letter}${isRow === true ? ' as part of its row' : ''}`;
  return mode === null ? wall : `${wall}, ${mode}`;
}

function linesOf(result: RunResult): readonly Line[] {
  const { settlement, slope, deflectionRatio, horizontalStrain } = result;
  const governing = governedBy(result);
  return [
    ['Settlement, greatest', settlementWords(settlement)],
    ['Slope, steepest', slopeWords(slope)],
    ...(deflectionRatio === null
      ? []
      : [['Deflection ratio Δ/L', percentWords(deflectionRatio, 4)] as const]),
    ...(horizontalStrain === null
      ? []
      : [['Horizontal strain', percentWords(horizontalStrain, 4)] as const]),
    ...(governing === null ? [] : [['Governed by', governing] as const]),
    ['Stage', stageWords(result)],
  ];
}

/** The figures that a run found of a building, line by line. */
export function FoundFigures({ result }: { readonly result: RunResult }) {
  return (
    <dl className="border-t border-hairline">
      {linesOf(result).map(([word, value]) => (
        <div
          key={word}
          className="flex min-h-row items-baseline justify-between gap-3 border-b border-hairline py-1 text-small"
        >
          <dt className="text-ink-2">{word}</dt>
          <dd className="text-right break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
