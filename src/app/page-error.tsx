import { Content } from '../components/layout/content.tsx';
import { Button } from '../components/ui/button.tsx';
import { ErrorNote } from '../components/ui/error-note.tsx';

/** In place of a page that failed. Most often a new version has taken the place of the one being read. */
export function PageError() {
  return (
    <Content className="p-8 max-sm:p-4">
      <title>Stopped · Groundsill</title>
      <ErrorNote
        failed="This page stopped."
        stands="What was saved still stands. What was being typed here is gone."
        action={
          <Button
            onClick={() => {
              window.location.reload();
            }}
          >
            Load it again
          </Button>
        }
      />
    </Content>
  );
}
