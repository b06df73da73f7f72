import { useQuery } from '@tanstack/react-query';
import { useCallback } from 'react';
import { useVisitStore } from '../draft/visit-store-context.ts';

/** A photograph that is on this phone only. */
export function KeptPicture({ id, alt }: { readonly id: string; readonly alt: string }) {
  const store = useVisitStore();
  const { data: file = null } = useQuery({
    queryKey: ['kept-photograph', id],
    queryFn: async () => (await store.photograph(id)) ?? null,
    staleTime: Infinity,
    gcTime: 0,
  });
  const show = useCallback(
    (image: HTMLImageElement) => {
      if (file === null) return undefined;
      const url = URL.createObjectURL(file);
      image.src = url;
      return () => {
        URL.revokeObjectURL(url);
      };
    },
    [file],
  );
  return <img ref={show} alt={alt} className="size-24 flex-none border border-rule object-cover" />;
}
