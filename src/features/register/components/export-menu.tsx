import type { RegisterColumn } from '../../../../shared/schemas/register.ts';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { Chevron } from '../../../components/ui/chevron.tsx';
import { FormatMenu } from '../../../components/ui/format-menu.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { exportPath } from '../api/export-path.ts';
import type { Which } from '../api/which-buildings.ts';

type ExportMenuProps = {
  readonly schemeId: string;
  readonly which: Which;
  readonly columns: readonly RegisterColumn[];
  readonly found: number;
};

const FORMATS = [
  { format: 'xlsx', name: 'XLSX', note: 'spreadsheet' },
  { format: 'csv', name: 'CSV', note: 'table as text' },
  { format: 'geojson', name: 'GeoJSON', note: 'with footprints' },
] as const;

/** The columns of the file: the building's own are in the table in one. */
function columnsOfFile(columns: readonly RegisterColumn[]): RegisterColumn[] {
  return [...new Set<RegisterColumn>(['reference', 'name', 'address', 'use', ...columns])];
}

/** What is seen as a file: the same buildings, order and columns. */
export function ExportMenu({ schemeId, which, columns, found }: ExportMenuProps) {
  return (
    <FormatMenu
      button={
        <>
          Export <Chevron />
        </>
      }
      buttonClassName={buttonStyle('plain')}
      align="right"
      holds={`${formatCount(found)} buildings, as shown`}
      links={FORMATS.map(({ format, name, note }) => ({
        ...{ name, note },
        href: exportPath(schemeId, which, format, columnsOfFile(columns)),
      }))}
    />
  );
}
