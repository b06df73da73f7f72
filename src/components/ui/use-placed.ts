import { useLayoutEffect, useRef } from 'react';
import { NARROW } from '../../hooks/use-media.ts';

const FOCUSABLE = 'input, select, button';
const EDGE = 8;
const GAP = 4;

function putInside(panel: HTMLElement): void {
  const over = panel.getBoundingClientRect().right - document.documentElement.clientWidth + EDGE;
  if (over > 0) panel.style.marginLeft = `${-over}px`;
}

/** Under its button, or over it where there is no room, wherever the page is scrolled to. */
function putBeside(panel: HTMLElement): void {
  const button = panel.parentElement?.getBoundingClientRect();
  // on a phone it lies along the foot of the window
  if (button === undefined || window.matchMedia(NARROW).matches) return;
  const { offsetWidth, offsetHeight } = panel;
  const room = document.documentElement.clientWidth - offsetWidth - EDGE;
  const under = button.bottom + GAP;
  const fits = under + offsetHeight <= window.innerHeight - EDGE;
  const top = fits ? under : Math.max(EDGE, button.top - GAP - offsetHeight);
  panel.style.left = `${Math.max(EDGE, Math.min(button.left, room))}px`;
  panel.style.top = `${top}px`;
}

/** Keeps what opens under its button inside of the window, and leaves the focus where it is. */
export function useInside(isOpen: boolean) {
  const panel = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    if (isOpen && panel.current !== null) putInside(panel.current);
  }, [isOpen]);
  return panel;
}

/** Keeps what opens inside of the window, and gives it the focus; what is free goes along with its button. */
export function usePlaced(isOpen: boolean, isFree: boolean) {
  const panel = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    const element = panel.current;
    if (!isOpen || element === null) return undefined;
    const place = () => {
      (isFree ? putBeside : putInside)(element);
    };
    place();
    element.querySelector<HTMLElement>(FOCUSABLE)?.focus({ preventScroll: true });
    if (!isFree) return undefined;
    window.addEventListener('scroll', place, true);
    window.addEventListener('resize', place);
    return () => {
      window.removeEventListener('scroll', place, true);
      window.removeEventListener('resize', place);
    };
  }, [isOpen, isFree]);
  return panel;
}
