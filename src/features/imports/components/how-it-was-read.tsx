import type { ReactNode } from 'react';
import { IMPORT_FIELDS, type ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { fieldWords } from '../field-words.ts';

function systemWords({ options, place }: ImportAnswer): string {
  const { crs, exchangeAxes, shift } = options.place;
  if (crs === null) return 'not known';
  const [east, north] = shift;
  const moved = `, shifted ${formatCount(east)} m east and ${formatCount(north)} m north`;
  return [
    `EPSG:${crs}`,
    place?.name === null || place === null ? '' : ` ${place.name}`,
    exchangeAxes ? ', axes exchanged' : '',
    east === 0 && north === 0 ? '' : moved,
  ].join('');
}

/** What was chosen, once it cannot be changed any more. */
export function HowItWasRead({ answer }: { readonly answer: ImportAnswer }) {
  const { columns } = answer.options;
  const facts: (readonly [string, ReactNode])[] = [
    ...(answer.layer === null ? [] : [['Layer', answer.layer] as const]),
    ...(answer.kind === 'values' ? [] : [['System', systemWords(answer)] as const]),
    ...IMPORT_FIELDS.flatMap((field) => {
      const column = columns[field];
      return column === undefined ? [] : [[fieldWords(field).label, column] as const];
    }),
  ];
  if (answer.kind === null) return null;
  return (
    <Panel title="How it was read">
      <Facts facts={facts} />
    </Panel>
  );
}
