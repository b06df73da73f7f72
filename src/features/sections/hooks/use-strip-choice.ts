import { useState } from 'react';
import { z } from 'zod';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { readKept, writeKept } from '../../../lib/kept-choice.ts';

/** How high the drawing in the strip may be, in pixels. */
export const STRIP_HEIGHT = { least: 120, most: 480, step: 20 } as const;

const choiceSchema = z.object({
  isOpen: z.boolean(),
  view: z.enum(['across', 'along']),
  height: z.number().min(STRIP_HEIGHT.least).max(STRIP_HEIGHT.most),
});

type Choice = z.infer<typeof choiceSchema>;
export type SectionView = Choice['view'];

const USUAL_HEIGHT = 196;

/** How a person has the strip, on a phone apart: there it is shut until it is asked for. */
export function useStripChoice(personId: string) {
  const isNarrow = useMedia(NARROW);
  const key = `section-strip.${isNarrow ? 'phone' : 'desk'}.${personId}`;
  const [chosen, setChosen] = useState<Readonly<Record<string, Choice>>>({});
  const usual: Choice = { isOpen: !isNarrow, view: 'across', height: USUAL_HEIGHT };
  const choice = chosen[key] ?? readKept(key, choiceSchema) ?? usual;

  function choose(change: Partial<Choice>): void {
    const next = { ...choice, ...change };
    writeKept(key, next);
    setChosen((now) => ({ ...now, [key]: next }));
  }
  return {
    ...choice,
    open: (isOpen: boolean) => {
      choose({ isOpen });
    },
    see: (view: SectionView) => {
      choose({ view });
    },
    resize: (height: number) => {
      const { least, most } = STRIP_HEIGHT;
      choose({ height: Math.round(Math.min(most, Math.max(least, height))) });
    },
  };
}

export type StripChoice = ReturnType<typeof useStripChoice>;
