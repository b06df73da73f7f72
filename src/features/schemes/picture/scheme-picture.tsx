import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import type { ExtentAnswer } from '../../../../shared/schemas/buildings.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { backgroundQuery } from '../../background/api/list-background.ts';
import { basemapQuery } from '../../map/api/get-basemap.ts';
import { planOfScheme } from '../../plan/plan-of-scheme.ts';
import { usePerson } from '../../session/person-context.ts';
import { drawPicture } from './draw-picture.ts';
import { loadPicture } from './load-picture.ts';
import { PICTURE_SIZE } from './picture-size.ts';

type SchemePictureProps = { readonly scheme: SchemeAnswer; readonly extent: ExtentAnswer };

function usePicture({ scheme, extent }: SchemePictureProps) {
  const { demo } = usePerson();
  const { data: background } = useQuery(backgroundQuery(scheme.id));
  const basemap = useQuery({ ...basemapQuery, enabled: demo });
  const { id, registerVersion, backgroundVersion } = scheme;
  return useQuery({
    queryKey: ['schemes', id, 'picture', registerVersion, backgroundVersion],
    enabled: background !== undefined && !(demo && basemap.isPending),
    staleTime: Infinity,
    queryFn: ({ signal }) => {
      const hasBackground = background?.some(({ features }) => features > 0) === true;
      const { origin } = window.location;
      const plan = planOfScheme({ scheme, extent, basemap: basemap.data, hasBackground, origin });
      return loadPicture(plan, extent, PICTURE_SIZE, signal);
    },
  });
}

/** A scheme's town as a small plan. */
export function SchemePicture(props: SchemePictureProps) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const { data: picture } = usePicture(props);
  useEffect(() => {
    if (picture !== undefined && canvas.current !== null) drawPicture(canvas.current, picture);
  }, [picture]);
  return <canvas ref={canvas} aria-hidden="true" className="block size-full" />;
}
