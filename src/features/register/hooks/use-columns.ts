import { useState } from 'react';
import { z } from 'zod';
import { REGISTER_COLUMNS, type RegisterColumn } from '../../../../shared/schemas/register.ts';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { readKept, writeKept } from '../../../lib/kept-choice.ts';
import {
  FEW_COLUMNS,
  FEW_RESULTS,
  inOrder,
  USUAL_COLUMNS,
  USUAL_RESULTS,
} from '../register-columns.ts';

const keptSchema = z.array(z.enum(REGISTER_COLUMNS));

/** The columns that a person has chosen, for a phone apart; else the usual ones, with results where there are any. */
export function useColumns(
  personId: string,
  hasResults: boolean,
): readonly [
  columns: readonly RegisterColumn[],
  choose: (columns: readonly RegisterColumn[]) => void,
] {
  const isNarrow = useMedia(NARROW);
  const key = `register-columns.${isNarrow ? 'phone' : 'desk'}.${personId}`;
  const [chosen, setChosen] = useState<Readonly<Record<string, readonly RegisterColumn[]>>>({});
  const [few, many] = hasResults ? [FEW_RESULTS, USUAL_RESULTS] : [FEW_COLUMNS, USUAL_COLUMNS];
  const usual = isNarrow ? few : many;
  const columns = chosen[key] ?? readKept(key, keptSchema) ?? usual;
  return [
    inOrder(columns),
    (next) => {
      writeKept(key, next);
      setChosen((now) => ({ ...now, [key]: next }));
    },
  ];
}
