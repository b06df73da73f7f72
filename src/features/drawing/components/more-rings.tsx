import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { beginRing, type RingKind } from '../drafts/edit-rings.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

const KINDS: readonly { readonly kind: RingKind; readonly words: string; readonly key: string }[] =
  [
    { kind: 'courtyard', words: 'Add a courtyard', key: 'H' },
    { kind: 'part', words: 'Add a part', key: 'N' },
  ];

/** The ways to a courtyard inside and to a part beside what is drawn. */
export function MoreRings({ drafting }: Pick<PlanDrawing, 'drafting'>) {
  return (
    <div className="mt-2 flex flex-wrap gap-2">
      {KINDS.map(({ kind, words, key }) => (
        <Button
          key={kind}
          onClick={() => {
            drafting.editShape((now) => beginRing(now, kind));
          }}
        >
          {words}{' '}
          <span className="max-sm:hidden">
            <KeyCap>{key}</KeyCap>
          </span>
        </Button>
      ))}
    </div>
  );
}
