import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';

/** What the drawing of a section shows, for who cannot see it. */
export function sectionWords({ result, section }: Pick<OpenedWall, 'result' | 'section'>): string {
  const most = millimetresFromMetres(result.settlementMax).toFixed(1);
  const zones = result.zones.map(({ mode, start, end, deflection, horizontalStrain }) => {
    const where = `${start.toFixed(1)} to ${end.toFixed(1)} m`;
    const bent = `Δ ${millimetresFromMetres(deflection).toFixed(2)} mm`;
    return `${mode} ${where}, ${bent}, horizontal strain ${percentWords(horizontalStrain, 4)}`;
  });
  const all = zones.length === 0 ? 'no zone' : zones.join('; ');
  return `Settlement along ${section.length.toFixed(1)} m of wall, largest ${most} mm: ${all}.`;
}
