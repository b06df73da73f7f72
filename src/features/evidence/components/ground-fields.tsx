import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { DraftField, type DraftProps } from './draft-field.tsx';

const PAIR = 'grid grid-cols-2 items-start gap-3';

function Strip(props: DraftProps) {
  return (
    <div className="grid grid-cols-3 items-start gap-3">
      <DraftField {...props} name="from" label="From chainage" unit="m" />
      <DraftField {...props} name="to" label="To chainage" unit="m" hint="Empty is the end." />
      <DraftField {...props} name="overlap" label="Overlap" unit="m" />
    </div>
  );
}

function Sections(props: DraftProps) {
  const { draft, onChange } = props;
  return (
    <>
      <Checkbox
        label="The long section"
        checked={draft.isLong}
        onChange={({ target }) => {
          onChange({ isLong: target.checked });
        }}
      />
      <div className={PAIR}>
        <DraftField
          {...props}
          name="across"
          label="Sections across at chainages"
          hint="In m, with commas between."
        />
        <DraftField {...props} name="halfWidth" label="To either side" unit="m" />
        <DraftField {...props} name="exaggeration" label="Levels drawn" unit="times" />
        <DraftField
          {...props}
          name="settlementExaggeration"
          label="Settlement drawn"
          unit="times"
        />
      </div>
    </>
  );
}

/** The ground that is shown: round a point, along the line, or cut through. */
export function GroundFields(props: DraftProps) {
  const { kind } = props.draft;
  if (kind === 'schedule') return null;
  if (kind === 'strip') return <Strip {...props} />;
  if (kind === 'sections') return <Sections {...props} />;
  return (
    <div className={PAIR}>
      <DraftField {...props} name="east" label="Easting of the middle" unit="m" />
      <DraftField {...props} name="north" label="Northing of the middle" unit="m" />
    </div>
  );
}
