import { useQuery } from '@tanstack/react-query';
import { BACKGROUND_LIMITS } from '../../../shared/schemas/background.ts';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { backgroundQuery } from '../../features/background/api/list-background.ts';
import { LayerRow } from '../../features/background/components/layer-row.tsx';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { NotFoundPage } from './not-found.tsx';

const LARGEST = BACKGROUND_LIMITS.bytes / 1024 / 1024;

const LEAD = 'What is drawn under the buildings.';
const HOW = `Bring in GeoJSON or a zipped Shapefile, up to ${LARGEST} MB each. A file takes the place of the one before once all of it has been read.`;

function Background() {
  const scheme = useScheme();
  const canChange = can(scheme, 'updateBackground');
  const { data: layers, error, refetch } = useQuery(backgroundQuery(scheme.id));
  return (
    <Page title="Background map" lead={canChange ? `${LEAD} ${HOW}` : LEAD}>
      {error !== null && (
        <QueryError what="The background" error={error} onRetry={() => void refetch()} />
      )}
      {layers === undefined && error === null && <LoadingRows what="the background" rows={4} />}
      {layers !== undefined && (
        <ul className="max-w-[760px] border-t-2 border-ink">
          {layers.map(({ layer, features }) => (
            <LayerRow key={layer} {...{ layer, features, canChange }} schemeId={scheme.id} />
          ))}
        </ul>
      )}
    </Page>
  );
}

export function BackgroundPage() {
  return can(useScheme(), 'readRegister') ? <Background /> : <NotFoundPage />;
}
