import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import type { ChosenBuilding } from '../../appointments/components/building-choice.tsx';
import { OfferDialog } from '../../appointments/components/offer-dialog.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { UndertakingDialog } from '../../undertakings/components/undertaking-dialog.tsx';
import { useLinesOfOwners } from '../hooks/use-lines-of-owners.tsx';

type StepsProps = { readonly building: ChosenBuilding };

/** The first steps from a building. */
function Steps({ building }: StepsProps) {
  const scheme = useScheme();
  const [asks, setAsks] = useState<'appointment' | 'undertaking' | null>(null);
  const close = () => {
    setAsks(null);
  };
  const props = { schemeId: scheme.id, building, onClose: close };
  return (
    <>
      <span className="flex gap-2 print:hidden">
        {can(scheme, 'answerMatters') && (
          <Button
            onClick={() => {
              setAsks('appointment');
            }}
          >
            Offer an appointment…
          </Button>
        )}
        {can(scheme, 'updateUndertakings') && (
          <Button
            onClick={() => {
              setAsks('undertaking');
            }}
          >
            Add an undertaking…
          </Button>
        )}
      </span>
      {asks === 'appointment' && <OfferDialog {...props} />}
      {asks === 'undertaking' && <UndertakingDialog {...props} undertaking={null} />}
    </>
  );
}

/** What owners of a building have brought up, what is agreed with them and what was promised. */
export function OwnersOfBuilding({ building }: { readonly building: ChosenBuilding }) {
  const scheme = useScheme();
  const { lines, error, isThere } = useLinesOfOwners(building.id);
  if (!can(scheme, 'readUndertakings')) return null;
  return (
    <Panel title="Owners" action={<Steps building={building} />}>
      <MutationError failed="What owners wrote could not be fetched." error={error} />
      {isThere && lines.length === 0 && (
        <p className="mt-2 text-small text-ink-2">
          Nothing yet. Letters, what owners bring up, appointments and undertakings stand here.
        </p>
      )}
      <ul>
        {lines.map(({ id, to, words, mark }) => (
          <li
            key={id}
            className="flex items-baseline justify-between gap-3 border-b border-hairline py-1.5 text-small last:border-0 print:break-inside-avoid"
          >
            <Link to={to} className="min-w-0 truncate">
              {words}
            </Link>
            {mark}
          </li>
        ))}
      </ul>
    </Panel>
  );
}
