import type { RegisterColumn } from '../../../../shared/schemas/register.ts';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { Chevron } from '../../../components/ui/chevron.tsx';
import { Menu, MENU_LINE } from '../../../components/ui/menu.tsx';
import { formatCount } from '../../../lib/format-number.ts';
import { exportPath, type ExportFormat } from '../api/export-path.ts';
import type { Which } from '../api/which-buildings.ts';

type ExportMenuProps = {
  readonly schemeId: string;
  readonly which: Which;
  readonly columns: readonly RegisterColumn[];
  readonly found: number;
};

const FORMATS: readonly { format: ExportFormat; name: string; note: string }[] = [
  { format: 'xlsx', name: 'XLSX', note: 'spreadsheet' },
  { format: 'csv', name: 'CSV', note: 'table as text' },
  { format: 'geojson', name: 'GeoJSON', note: 'with footprints' },
];

/** The columns of the file: the building's own are in the table in one. */
function columnsOfFile(columns: readonly RegisterColumn[]): RegisterColumn[] {
  return [...new Set<RegisterColumn>(['reference', 'name', 'address', 'use', ...columns])];
}

/** What is seen as a file: the same buildings, order and columns. */
export function ExportMenu({ schemeId, which, columns, found }: ExportMenuProps) {
  return (
    <Menu
      button={
        <>
          Export <Chevron />
        </>
      }
      buttonClassName={buttonStyle('plain')}
      align="right"
    >
      <p className="px-3 pb-1 text-cap text-ink-3">{formatCount(found)} buildings, as shown</p>
      {FORMATS.map(({ format, name, note }) => (
        <a
          key={format}
          download
          className={MENU_LINE}
          href={exportPath(schemeId, which, format, columnsOfFile(columns))}
        >
          <span className="w-16 font-medium">{name}</span>
          <span className="text-ink-3">{note}</span>
        </a>
      ))}
    </Menu>
  );
}
