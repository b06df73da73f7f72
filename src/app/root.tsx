import { Outlet } from 'react-router-dom';
import { useFocusOnArrival } from '../hooks/use-focus-on-arrival.ts';

/** Around every page: full height, and the way past the bar for who walks by keyboard. */
export function Root() {
  useFocusOnArrival('content');
  return (
    <div className="flex h-full flex-col print:block print:h-auto">
      <a
        href="#content"
        className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:m-2 focus:bg-sheet focus:p-2"
      >
        Go to the content
      </a>
      <Outlet />
    </div>
  );
}
