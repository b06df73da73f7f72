import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useEffectEvent, useRef } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useImportDraft } from '../hooks/use-import-draft.ts';
import { useReport } from '../hooks/use-report.ts';
import { useLastChecked } from '../hooks/use-last-checked.ts';
import { isOpen, isWorking } from '../import-states.ts';
import { ConfirmBar } from './confirm-bar.tsx';
import { ImportBasis } from './import-basis.tsx';
import { ImportMap } from './import-map.tsx';
import { ImportReading } from './import-reading.tsx';

/** Once buildings have come in, everything that shows the register asks again. */
function useRefreshWhenDone(schemeId: string, state: ImportAnswer['state']): void {
  const client = useQueryClient();
  const before = useRef(state);
  const refresh = useEffectEvent(() => {
    void refreshRegister(client, schemeId);
  });
  useEffect(() => {
    if (state === 'done' && before.current !== 'done') refresh();
    before.current = state;
  }, [state]);
}

/** An import from top to bottom: where, what, what will happen; the map at the right, the deed at the foot. */
export function ImportDesk({ answer }: { readonly answer: ImportAnswer }) {
  const scheme = useScheme();
  const draft = useImportDraft(scheme.id, answer);
  const checked = useLastChecked(answer);
  const report = useReport(scheme.id, answer, checked);
  useRefreshWhenDone(scheme.id, answer.state);
  const hasBar = isOpen(answer.state) || isWorking(answer.state);
  const hasMap = answer.kind !== 'values' && (hasBar || answer.state === 'done');
  return (
    <>
      <ImportBasis answer={answer} />
      <div
        className={
          hasMap
            ? 'grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_minmax(0,42%)] max-md:flex max-md:flex-none max-md:flex-col'
            : 'flex min-h-0 flex-1 flex-col max-md:flex-none'
        }
      >
        <div className="flex min-h-0 min-w-0 flex-col">
          <ImportReading answer={answer} checked={checked} draft={draft} report={report} />
          {hasBar && <ConfirmBar answer={answer} draft={draft} />}
        </div>
        {hasMap && (
          <div className="min-w-0 border-l border-ink max-md:order-first max-md:h-[36vh] max-md:min-h-[280px] max-md:border-b max-md:border-l-0">
            <ImportMap
              fileName={answer.fileName}
              checked={checked}
              row={report.open}
              centre={report.centre}
              places={report.places}
              onRow={(row) => {
                if (row === null) report.setOpen(null);
                else void report.openByRow(row);
              }}
            />
          </div>
        )}
      </div>
    </>
  );
}
