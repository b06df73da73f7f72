import { useSectionMark, type SectionDesk } from '../../sections/hooks/use-section-desk.ts';
import { MapPane, type MapPaneProps } from './map-pane.tsx';

type MapWithSectionProps = Omit<MapPaneProps, 'section' | 'onCursor'> & {
  readonly sections: SectionDesk;
};

/** The map with the mark of the section, which follows the cursor. */
export function MapWithSection({ sections, ...pane }: MapWithSectionProps) {
  return <MapPane {...pane} section={useSectionMark(sections)} onCursor={sections.point} />;
}
