import { useMemo } from 'react';
import { axisLevelAt } from '../../../../shared/assessment/axis-level-at.ts';
import { longSection } from '../../../../shared/assessment/long-section.ts';
import type { SettlementOnLine } from '../../../../shared/assessment/settlement-along.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { useWorked } from '../../alignments/hooks/use-worked.ts';
import type { Question } from '../../alignments/preview/preview-work.ts';
import { alongLayout } from '../along-layout.ts';
import { alongWords, largestAlong } from '../section-words.ts';
import { AlongDrawing } from './along-drawing.tsx';
import { AlongTables } from './along-tables.tsx';
import { BracketLegend } from './bracket-legend.tsx';
import type { SectionViewProps } from './section-view-props.ts';
import { StripFault } from './strip-fault.tsx';
import { StripHead } from './strip-head.tsx';

const ALONG: Question = { kind: 'along' };
const NOTHING: readonly SettlementOnLine[] = [];
const MILLIMETRES = 1000;

function useAlong({ desk }: SectionViewProps) {
  const { thread, preview } = desk.line;
  const worked = useWorked(thread, preview, ALONG);
  return {
    settlements: worked?.kind === 'along' ? worked.rows : NOTHING,
    isPending: worked === null,
    fault: worked?.kind === 'fault' ? worked.message : null,
  };
}

/** The long section, with settlement over the line below it. */
export function AlongView(props: SectionViewProps & { readonly design: AlignmentDesign }) {
  const { design, width, tools, chainage } = props;
  const { height } = tools.strip;
  const { settlements, isPending, fault } = useAlong(props);
  const rows = useMemo(() => longSection(design), [design]);
  const largest = useMemo(() => largestAlong(settlements), [settlements]);
  const most = Math.max(1, ...settlements.map((one) => (one.settlement?.high ?? 0) * MILLIMETRES));
  const layout = alongLayout(rows, most, width, height);
  return (
    <>
      <StripHead {...tools} words={`height drawn ${layout.factor} times length`}>
        {largest !== null && <BracketLegend largest={largest.settlement} />}
      </StripHead>
      <StripFault fault={fault} />
      {tools.isTable ? (
        <AlongTables {...{ rows, settlements, height }} />
      ) : (
        <AlongDrawing
          {...{ rows, settlements, layout, chainage }}
          axis={axisLevelAt(design.levels, chainage)}
          onGo={tools.onGo}
          label={alongWords(
            rows.at(-1)?.chainage ?? 0,
            layout.factor,
            isPending ? null : settlements,
          )}
        />
      )}
    </>
  );
}
