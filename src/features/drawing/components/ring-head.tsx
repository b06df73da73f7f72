import { Button } from '../../../components/ui/button.tsx';

type RingHeadProps = {
  readonly name: string;
  /** How it is called where it is taken away. */
  readonly removed: string;
  /** Takes it away; null for what has to stay. */
  readonly onRemove: (() => void) | null;
};

/** What a ring is called, over its columns. */
export function RingHead({ name, removed, onRemove }: RingHeadProps) {
  return (
    <>
      <caption className="py-1 text-left text-small font-semibold">
        <span className="flex items-baseline justify-between">
          {name}
          {onRemove !== null && (
            <Button
              kind="quiet"
              className="h-6"
              aria-label={`Remove ${removed}`}
              onClick={onRemove}
            >
              Remove it
            </Button>
          )}
        </span>
      </caption>
      <thead className="text-cap text-ink-3">
        <tr>
          <th scope="col" className="w-6">
            <span className="sr-only">Number</span>
          </th>
          <th scope="col" className="pr-1 text-right font-normal">
            Easting m
          </th>
          <th scope="col" className="text-right font-normal">
            Northing m
          </th>
          <td className="w-12 max-md:w-[88px]" />
        </tr>
      </thead>
    </>
  );
}
