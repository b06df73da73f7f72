import { useState, type DragEvent } from 'react';
import { IMPORT_LIMITS } from '../../../../shared/schemas/imports.ts';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { classNames } from '../../../lib/class-names.ts';

type DropPlaceProps = {
  readonly onFile: (file: File) => void;
  readonly onSeveral: () => void;
};

const ACCEPT = '.geojson,.json,.zip,.gpkg,.csv,.txt,.tsv,.xlsx,.city.json,.cityjson';
const LARGEST = IMPORT_LIMITS.bytes / 1024 / 1024;

/** A large calm place for a file, dropped or chosen. */
export function DropPlace({ onFile, onSeveral }: DropPlaceProps) {
  const [isOver, setOver] = useState(false);

  function hold(event: DragEvent) {
    event.preventDefault();
    setOver(true);
  }
  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    const [file, ...others] = event.dataTransfer.files;
    if (others.length > 0) onSeveral();
    else if (file !== undefined) onFile(file);
  }
  return (
    <div
      onDragOver={hold}
      onDragLeave={() => {
        setOver(false);
      }}
      onDrop={drop}
      className={classNames(
        'grid min-h-[220px] max-w-[860px] content-center justify-items-center gap-3 border border-dashed px-6 py-8 text-center max-sm:min-h-[180px] max-sm:px-4',
        isOver ? 'border-select bg-select-wash' : 'border-control bg-sheet',
      )}
    >
      <p className="text-h3 font-semibold">Drop a file here</p>
      <FileButton label="Choose a file of buildings" accept={ACCEPT} onFile={onFile}>
        Choose a file
      </FileButton>
      <div className="mt-1 grid max-w-[60ch] gap-1 text-small text-ink-2">
        <p>GeoJSON, zipped Shapefile, GeoPackage, CSV with WKT outlines, or CityJSON.</p>
        <p>CSV or XLSX without outlines joins values to buildings by their reference.</p>
        <p className="text-ink-3">Up to {LARGEST} MB.</p>
      </div>
    </div>
  );
}
