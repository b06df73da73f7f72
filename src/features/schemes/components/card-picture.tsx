import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense } from 'react';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { extentQuery } from '../../buildings/api/get-extent.ts';
import { can } from '../can.ts';

/** Tiles are read only where there is something to draw. */
const SchemePicture = lazy(async () => {
  const { SchemePicture: component } = await import('../picture/scheme-picture.tsx');
  return { default: component };
});

/** The small plan of a scheme that has buildings, for who may see them. */
export function CardPicture({ scheme }: { readonly scheme: SchemeAnswer }) {
  const mayRead = can(scheme, 'readRegister');
  const { data: extent } = useQuery({ ...extentQuery(scheme.id), enabled: mayRead });
  if (extent?.from !== 'buildings') return null;
  return (
    <div className="aspect-[356/150] overflow-hidden border-b border-rule bg-land">
      <Suspense>
        <SchemePicture scheme={scheme} extent={extent} />
      </Suspense>
    </div>
  );
}
