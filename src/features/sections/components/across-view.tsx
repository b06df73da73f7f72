import { useMemo } from 'react';
import type { TroughOfSection } from '../../../../shared/assessment/trough-of-section.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { exaggeration } from '../../../../shared/presentation/true-scale.ts';
import { useWorked } from '../../alignments/hooks/use-worked.ts';
import { acrossLayout } from '../across-layout.ts';
import { useCutBuildings } from '../hooks/use-cut-buildings.ts';
import { acrossWords, volumeWords } from '../section-words.ts';
import { withCategories } from '../shown-categories.ts';
import { AcrossDrawing } from './across-drawing.tsx';
import { AcrossTables } from './across-tables.tsx';
import { BracketLegend } from './bracket-legend.tsx';
import type { SectionViewProps } from './section-view-props.ts';
import { StripFault } from './strip-fault.tsx';
import { StripHead } from './strip-head.tsx';

/** The deepest trough takes so much of the ground over the crown, or of the least cover, in metres. */
const [SHARE, LEAST_COVER] = [0.75, 6];

function factorOf({ section, largest }: TroughOfSection): number {
  if (largest === null || largest.high <= 0) return 1;
  const crowns = section.bores.map(({ axis, diameter }) => axis + diameter / 2);
  const cover = Math.max(LEAST_COVER, section.groundLevel - Math.max(...crowns));
  return exaggeration((SHARE * cover) / largest.high);
}

function useAcross({ desk, chainage }: SectionViewProps, halfWidth: number) {
  const { thread, preview } = desk.line;
  const question = useMemo(
    () => ({ kind: 'across', chainage, halfWidth }) as const,
    [chainage, halfWidth],
  );
  const worked = useWorked(thread, preview, question);
  return {
    trough: worked?.kind === 'across' ? worked.trough : null,
    fault: worked?.kind === 'fault' ? worked.message : null,
  };
}

type AcrossViewProps = SectionViewProps & { readonly design: AlignmentDesign };

/** The trough across the line where the section is. */
export function AcrossView(props: AcrossViewProps) {
  const { design, width, tools, selected, shown } = props;
  const { height } = tools.strip;
  const layout = useMemo(() => acrossLayout(design, width, height), [design, width, height]);
  const { trough, fault } = useAcross(props, layout.halfWidth);
  const { buildings: cut, hasFailed } = useCutBuildings(trough?.section ?? null, layout.halfWidth);
  const buildings = useMemo(() => withCategories(cut, shown.shading), [cut, shown.shading]);
  const { denominator, halfWidth } = layout;
  const factor = trough === null ? 1 : factorOf(trough);
  const largest = trough?.largest ?? null;
  const volume = trough?.volume ?? null;
  const scales = `1 : ${denominator}` + (largest === null ? '' : `, settlement × ${factor}`);
  return (
    <>
      <StripHead {...tools} words={scales}>
        {largest !== null && <BracketLegend largest={largest} />}
        {volume !== null && <span>trough {volumeWords(volume)}</span>}
      </StripHead>
      <StripFault fault={fault} />
      {hasFailed && <p className="px-4 text-cap text-clay-deep">Buildings could not be fetched.</p>}
      {trough !== null && tools.isTable && (
        <AcrossTables {...{ trough, buildings, shown, halfWidth, height }} />
      )}
      {trough !== null && !tools.isTable && (
        <AcrossDrawing
          {...{ layout, buildings, selected, factor }}
          section={trough.section}
          most={largest?.high ?? 0}
          label={acrossWords(trough, { denominator, factor }, buildings.length)}
        />
      )}
      {trough === null && <div style={{ height }} />}
    </>
  );
}
