import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/**
 * After a change of page the focus goes to its content, unless something there has it already: what was
 * pressed may be gone, and who listens wants to hear what is new.
 */
export function useFocusOnArrival(id: string): void {
  const { pathname } = useLocation();
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    const content = document.getElementById(id);
    if (content === null || content.contains(document.activeElement)) return;
    content.focus({ preventScroll: true });
    content.scrollTop = 0;
  }, [id, pathname]);
}
