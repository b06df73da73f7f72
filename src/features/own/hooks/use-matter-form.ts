import { useState } from 'react';
import { newMatterSchema, type MatterKind } from '../../../../shared/schemas/matters.ts';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { ApiError } from '../../../lib/api-error.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useSendMatter } from '../api/send-matter.ts';
import { NO_CORRECTION, suggestionOf } from '../correction-draft.ts';
import { FIELD_WORDS } from '../own-words.ts';
import { usePhotographs } from './use-photographs.ts';

type Faults = Readonly<Record<string, string>>;

function faultsOf(fields: readonly { readonly path: string; readonly message: string }[]): Faults {
  return Object.fromEntries(fields.map(({ path, message }) => [path, message]));
}

/**
 * What an owner is writing, kept while it is sent and when that fails. It is numbered once, so that sent again
 * it is there once.
 */
export function useMatterForm(
  buildingId: number,
  kind: MatterKind,
  onDone: (matter: OwnMatter) => void,
) {
  const scheme = useScheme();
  const [id] = useState(() => crypto.randomUUID());
  const [title, setTitle] = useState('');
  const [text, setText] = useState('');
  const [correction, setCorrection] = useState(NO_CORRECTION);
  const [own, setOwn] = useState<Faults>({});
  const [refusals, setRefusals] = useState(0);
  const photographs = usePhotographs();
  const sending = useSendMatter(scheme.id, onDone);
  const isCorrection = kind === 'correction';

  function send(): void {
    if (sending.isPending) return;
    const parsed = newMatterSchema.safeParse({
      ...{ id, buildingId, kind, text },
      title: isCorrection ? FIELD_WORDS[correction.field] : title,
      suggestion: isCorrection ? suggestionOf(correction) : null,
      photographs: photographs.announced,
    });
    setOwn(
      parsed.success
        ? {}
        : faultsOf(
            parsed.error.issues.map(({ path, message }) => ({ path: path.join('.'), message })),
          ),
    );
    if (!parsed.success) setRefusals(refusals + 1);
    else {
      sending.mutate({ matter: parsed.data, photographs: photographs.added });
    }
  }
  const refused = sending.error instanceof ApiError ? faultsOf(sending.error.fields) : {};
  return {
    ...{ title, setTitle, text, setText, correction, setCorrection, photographs, send },
    faults: { ...refused, ...own },
    error: sending.error,
    isSending: sending.isPending,
    /** How often it was sent with something missing. */
    refusals,
  };
}

export type MatterDraft = ReturnType<typeof useMatterForm>;
