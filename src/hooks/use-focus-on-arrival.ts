import { useEffect, useRef, type RefObject } from 'react';
import { useLocation, useNavigation } from 'react-router-dom';

/** The last thing the person did after setting out for a page, if anything. */
type Since = 'keydown' | 'pointerdown' | null;

/**
 * What the person has done since the last navigation began. A press or Enter may itself begin one, as long
 * as none is on its way.
 */
function useDoneSince(): RefObject<Since> {
  const isOnTheWay = useNavigation().state !== 'idle';
  const since = useRef<Since>(null);
  useEffect(() => {
    if (isOnTheWay) since.current = null;
    function note({ type }: Event) {
      since.current = type === 'keydown' ? 'keydown' : 'pointerdown';
    }
    function setOut() {
      if (!isOnTheWay) since.current = null;
    }
    function noteKey(event: KeyboardEvent) {
      note(event);
      if (event.key === 'Enter') setOut();
    }
    document.addEventListener('pointerdown', note, true);
    document.addEventListener('keydown', noteKey, true);
    document.addEventListener('click', setOut, true);
    return () => {
      document.removeEventListener('pointerdown', note, true);
      document.removeEventListener('keydown', noteKey, true);
      document.removeEventListener('click', setOut, true);
    };
  }, [isOnTheWay]);
  return since;
}

/**
 * After a change of page the focus goes to its content: what was pressed may be gone, and who listens wants
 * to hear what is new. It stays where it is when it is there already, or when the page was slow and the
 * person has gone on to something else.
 */
export function useFocusOnArrival(id: string): void {
  const { pathname } = useLocation();
  const last = useRef(pathname);
  const since = useDoneSince();
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    const content = document.getElementById(id);
    const focused = document.activeElement;
    if (content === null || content.contains(focused)) return;
    content.scrollTop = 0;
    // some browsers do not give the focus to a button that is pressed
    const isLost = focused === document.body && since.current !== 'pointerdown';
    if (since.current === null || isLost) content.focus({ preventScroll: true });
  }, [id, pathname, since]);
}
