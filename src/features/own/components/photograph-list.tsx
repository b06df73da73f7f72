import { MATTER_LIMITS } from '../../../../shared/schemas/matters.ts';
import { PHOTOGRAPH_TYPES } from '../../../../shared/schemas/visits.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { FileButton } from '../../../components/ui/file-button.tsx';
import type { Photographs } from '../hooks/use-photographs.ts';

const ACCEPT = PHOTOGRAPH_TYPES.join();

/** Photographs that go with a message, each with what it shows. */
export function PhotographList({ photographs }: { readonly photographs: Photographs }) {
  const { added, fault, hasRoom, add, caption, remove } = photographs;
  return (
    <div className="mt-3">
      {added.map(({ id, url, caption: words }, k) => (
        <fieldset key={id} className="mb-3 flex flex-wrap gap-4 border-b border-hairline pb-3">
          <legend className="sr-only">Photograph {k + 1}</legend>
          <img src={url} alt={words || `Photograph ${k + 1}`} className="h-24 w-32 object-cover" />
          <div className="min-w-48 flex-1">
            <Field
              label="What it shows"
              autoComplete="off"
              maxLength={MATTER_LIMITS.caption}
              value={words}
              onChange={({ target }) => {
                caption(id, target.value);
              }}
            />
            <Button
              kind="quiet"
              aria-label={`Remove photograph ${k + 1}`}
              onClick={() => {
                remove(id);
              }}
            >
              Remove
            </Button>
          </div>
        </fieldset>
      ))}
      <p role="status" className="text-clay-deep">
        {fault}
      </p>
      {hasRoom && (
        <div className="flex flex-wrap gap-2.5">
          <FileButton label="Take a photograph" accept={ACCEPT} camera onFile={add}>
            Take a photograph
          </FileButton>
          <FileButton label="Add a photograph from this device" accept={ACCEPT} onFile={add}>
            Add a photograph
          </FileButton>
        </div>
      )}
    </div>
  );
}
