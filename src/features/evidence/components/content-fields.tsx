import type { PlanContent } from '../../../../shared/schemas/evidence.ts';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { chosen, NAMES, SHOWS } from '../evidence-words.ts';
import type { DraftProps } from './draft-field.tsx';

const LAYERS = [
  ['contours', 'Settlement contours'],
  ['line', 'Drives and chainages'],
  ['background', 'Streets, water, parks'],
] as const;

/** What plans show. */
export function ContentFields({ draft: { content }, onChange }: DraftProps) {
  function set(change: Partial<PlanContent>) {
    onChange({ content: { ...content, ...change } });
  }
  return (
    <div className="grid gap-2">
      <div className="grid grid-cols-2 gap-3">
        <Select
          label="Buildings by"
          options={SHOWS}
          value={content.shows}
          onChange={({ target }) => {
            const shows = chosen(SHOWS, target.value);
            if (shows !== undefined) set({ shows });
          }}
        />
        <Select
          label="Names beside them"
          options={NAMES}
          value={content.names}
          onChange={({ target }) => {
            const names = chosen(NAMES, target.value);
            if (names !== undefined) set({ names });
          }}
        />
      </div>
      <div className="flex flex-wrap gap-x-4">
        {LAYERS.map(([name, label]) => (
          <Checkbox
            key={name}
            label={label}
            checked={content[name]}
            onChange={({ target }) => {
              set({ [name]: target.checked });
            }}
          />
        ))}
      </div>
    </div>
  );
}
