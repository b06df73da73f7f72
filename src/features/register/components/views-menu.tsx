import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterView } from '../../../../shared/schemas/register-views.ts';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { Chevron } from '../../../components/ui/chevron.tsx';
import { MENU_LINE } from '../../../components/ui/menu.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Popover } from '../../../components/ui/popover.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { useDeleteView } from '../api/delete-view.ts';
import { registerViewsQuery } from '../api/list-views.ts';
import { SaveView } from './save-view.tsx';

type Shown = Pick<RegisterView, 'filter' | 'sort' | 'columns'>;

type ViewsMenuProps = {
  readonly schemeId: string;
  /** What is shown now, to be kept. */
  readonly shown: Shown;
  readonly onChoose: (view: RegisterView) => void;
};

type ViewLineProps = {
  readonly view: RegisterView;
  readonly onChoose: () => void;
  readonly onDelete: () => void;
};

function ViewLine({ view, onChoose, onDelete }: ViewLineProps) {
  return (
    <li className="flex items-center gap-2">
      <button type="button" className={`${MENU_LINE} px-1`} onClick={onChoose}>
        <span className="truncate">{view.name}</span>
      </button>
      <button
        type="button"
        aria-label={`Delete the view ${view.name}`}
        className="flex-none px-1 text-cap text-clay-deep underline max-sm:min-h-11"
        onClick={onDelete}
      >
        Delete
      </button>
    </li>
  );
}

function Views({
  schemeId,
  shown,
  onChoose,
  close,
}: ViewsMenuProps & { readonly close: () => void }) {
  const { data, error, refetch } = useQuery(registerViewsQuery(schemeId));
  const deletion = useDeleteView(schemeId);
  const [isNaming, setNaming] = useState(false);
  if (isNaming) return <SaveView schemeId={schemeId} shown={shown} onDone={close} />;
  return (
    <>
      {error !== null && (
        <QueryError what="Your views" error={error} onRetry={() => void refetch()} />
      )}
      {data?.length === 0 && <p className="text-small text-ink-2">You keep no view yet.</p>}
      <ul>
        {data?.map((view) => (
          <ViewLine
            key={view.id}
            view={view}
            onChoose={() => {
              onChoose(view);
              close();
            }}
            onDelete={() => {
              deletion.mutate(view.id);
            }}
          />
        ))}
      </ul>
      <MutationError failed="The view was not deleted." error={deletion.error} />
      <button
        type="button"
        className={`${MENU_LINE} mt-1 border-t border-hairline px-1`}
        onClick={() => {
          setNaming(true);
        }}
      >
        Save what is shown as…
      </button>
    </>
  );
}

/** Views that the person keeps: which buildings, in which order, with which columns. */
export function ViewsMenu(props: ViewsMenuProps) {
  return (
    <Popover
      name="Views"
      button={
        <>
          Views <Chevron />
        </>
      }
      buttonClassName={buttonStyle('plain')}
    >
      {(close) => <Views {...props} close={close} />}
    </Popover>
  );
}
