import { Content } from '../components/layout/content.tsx';
import { Page } from '../components/layout/page.tsx';
import { Button } from '../components/ui/button.tsx';
import { ErrorNote } from '../components/ui/error-note.tsx';

/** In place of a page that failed. Most often a new version has taken the place of the one being read. */
export function PageError() {
  return (
    <Content>
      <Page title="This page stopped">
        <ErrorNote
          failed="What was saved still stands."
          stands="What was being typed here is gone. The server may be out of reach, or there may be a newer version of this page."
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
      </Page>
    </Content>
  );
}
