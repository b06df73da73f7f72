import { useState } from 'react';
import { z } from 'zod';
import { REGISTER_COLUMNS, type RegisterColumn } from '../../../../shared/schemas/register.ts';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { readKept, writeKept } from '../../../lib/kept-choice.ts';
import { FEW_COLUMNS, inOrder, USUAL_COLUMNS } from '../register-columns.ts';

const keptSchema = z.array(z.enum(REGISTER_COLUMNS));

/** The columns that a person has chosen, for a phone apart. */
export function useColumns(
  personId: string,
): readonly [
  columns: readonly RegisterColumn[],
  choose: (columns: readonly RegisterColumn[]) => void,
] {
  const isNarrow = useMedia(NARROW);
  const key = `register-columns.${isNarrow ? 'phone' : 'desk'}.${personId}`;
  const [chosen, setChosen] = useState<Readonly<Record<string, readonly RegisterColumn[]>>>({});
  const usual = isNarrow ? FEW_COLUMNS : USUAL_COLUMNS;
  const columns = chosen[key] ?? readKept(key, keptSchema) ?? usual;
  return [
    inOrder(columns),
    (next) => {
      writeKept(key, next);
      setChosen((now) => ({ ...now, [key]: next }));
    },
  ];
}
