/** Stands where the map will be; who waits for more than a second is told so. */
export function MapPause() {
  return (
    <div className="grid size-full place-items-center bg-land">
      <p role="status" className="appear-late text-small text-ink-3">
        Fetching the map.
      </p>
    </div>
  );
}
