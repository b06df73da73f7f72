import { useState } from 'react';
import { z } from 'zod';
import { useMedia } from '../../../hooks/use-media.ts';
import { readKept, writeKept } from '../../../lib/kept-choice.ts';

const ROOM_FOR_MAP = '(min-width: 1100px)';

/** Whether the map stands at the side: where there is room, unless the person has hidden it. */
export function useMapPane(personId: string) {
  const key = `register-map.${personId}`;
  const hasRoom = useMedia(ROOM_FOR_MAP);
  const [isWanted, setWanted] = useState(() => readKept(key, z.boolean()) ?? true);
  return {
    hasRoom,
    isShown: hasRoom && isWanted,
    show: (shown: boolean) => {
      writeKept(key, shown);
      setWanted(shown);
    },
  };
}

export type MapPane = ReturnType<typeof useMapPane>;
