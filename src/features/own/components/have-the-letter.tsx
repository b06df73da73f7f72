import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useAcknowledgeLetter } from '../api/acknowledge-letter.ts';

type HaveTheLetterProps = { readonly letterId: string; readonly onDone: () => void };

/** Tells that a letter has been read. */
export function HaveTheLetter({ letterId, onDone }: HaveTheLetterProps) {
  const acknowledge = useAcknowledgeLetter(useScheme().id, onDone);
  return (
    <>
      <MutationError failed="That did not reach us. Please try again." error={acknowledge.error} />
      <Button
        kind="main"
        busy={acknowledge.isPending}
        onClick={() => {
          acknowledge.mutate(letterId);
        }}
      >
        I have the letter
      </Button>
    </>
  );
}
