import { useQuery } from '@tanstack/react-query';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { mendQuery } from '../api/get-mend.ts';
import { outlinePicture } from '../outline-picture.ts';

type MendPicturesProps = {
  readonly schemeId: string;
  readonly importId: string;
  readonly row: number;
};

type OutlineProps = { readonly title: string; readonly viewBox: string; readonly path: string };

function Outline({ title, viewBox, path }: OutlineProps) {
  return (
    <figure className="border border-hairline bg-sheet p-1">
      <svg viewBox={viewBox} role="img" aria-label={title} className="h-[132px] w-[150px]">
        <path
          d={path}
          fillRule="evenodd"
          className="fill-bldg stroke-ink"
          strokeLinejoin="round"
          strokeWidth="1.2"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <figcaption className="text-center text-cap text-ink-2">{title}</figcaption>
    </figure>
  );
}

/** A crossing outline as it is in the file, and as it is once mended. */
export function MendPictures({ schemeId, importId, row }: MendPicturesProps) {
  const { data, error, refetch } = useQuery(mendQuery(schemeId, importId, row));
  if (error !== null) {
    return <QueryError what="The outline" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <p className="appear-late text-small">Fetching the outline.</p>;
  const { viewBox, paths } = outlinePicture([data.before, data.after ?? []]);
  const [before = '', after = ''] = paths;
  return (
    <div className="flex flex-wrap gap-3">
      <Outline title="In the file" viewBox={viewBox} path={before} />
      {data.after === null ? (
        <p className="self-center text-small text-ink-2">It cannot be mended.</p>
      ) : (
        <Outline title="Mended" viewBox={viewBox} path={after} />
      )}
    </div>
  );
}
