import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';

/** Lies over the map when some of it did not come. */
export function MapGaps({ onRetry }: { readonly onRetry: () => void }) {
  return (
    <div className="shadow-lift">
      <ErrorNote
        failed="Some of the map did not come."
        stands="What is drawn is right."
        action={<Button onClick={onRetry}>Fetch it again</Button>}
      />
    </div>
  );
}
