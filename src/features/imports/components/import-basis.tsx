import { IMPORT_FORMATS, type ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { BasisLine } from '../../../components/layout/basis-line.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { isOpen } from '../import-states.ts';

/** What an import rests on: its file, who brought it and when; a preview until it is confirmed. */
export function ImportBasis({ answer }: { readonly answer: ImportAnswer }) {
  const scheme = useScheme();
  const { format, layer, by, at, fileName, state } = answer;
  const kind = format === null ? null : IMPORT_FORMATS[format];
  return (
    <BasisLine
      preview={isOpen(state)}
      parts={[
        <b key="file">{fileName}</b>,
        ...(kind === null ? [] : [layer === null ? kind : `${kind}, ${layer}`]),
        `${by ?? 'Somebody'}, ${formatMoment(at)}`,
        `Into EPSG:${scheme.crs}`,
      ]}
      end={isOpen(state) ? 'Preview: nothing is written yet' : undefined}
    />
  );
}
