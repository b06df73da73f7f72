import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { CLASS_COLUMNS } from '../../../../shared/schemas/result-columns.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Menu, MENU_LINE } from '../../../components/ui/menu.tsx';
import { importsQuery } from '../../imports/api/list-imports.ts';
import { factsOf } from '../../../../shared/presentation/field-words.ts';
import {
  columnFilter,
  FILTER_PARTS,
  isBesideFields,
  isSet,
  STANDING_PARTS,
  withColumn,
  without,
  type FilterPart,
} from '../filter-parts.ts';
import { partLabel, partWords } from '../filter-words.ts';
import { AssumedChoice, ImportChoice, WithinChoice, type BesideProps } from './beside-choices.tsx';
import { FilterChip } from './filter-chip.tsx';
import { NumberRange } from './number-range.tsx';
import { WordChoices } from './word-choices.tsx';

type FilterBarProps = BesideProps & {
  readonly view: (() => readonly [number, number, number, number]) | null;
};

const ADD =
  'h-[26px] rounded border border-dashed border-control px-2.5 text-small text-clay-deep hover:border-ink max-sm:h-9';

function isStanding(part: FilterPart): boolean {
  return STANDING_PARTS.some((one) => one === part);
}

/** Those are chosen at the buildings themselves, or drawn on the map. */
function isByHand(part: FilterPart): boolean {
  return part === 'ids' || part === 'except' || part === 'inside';
}

type PartProps = FilterBarProps & { readonly part: FilterPart; readonly close: () => void };

/** What can be chosen for one part of the filter. */
function PartChoices({ part, close, ...props }: PartProps) {
  const { schemeId, filter, onFilter } = props;
  if (part === 'assumed') return <AssumedChoice {...props} />;
  if (part === 'importId') return <ImportChoice {...props} />;
  if (part === 'within') return <WithinChoice {...props} />;
  if (part === 'inside') {
    return (
      <p className="text-small text-ink-2">
        Buildings with their middle inside the outline. Lasso on the map draws another.
      </p>
    );
  }
  if (isBesideFields(part)) {
    return <p className="text-small text-ink-2">Buildings that were chosen one by one.</p>;
  }
  const { kind, unit } = factsOf(part);
  const chosen = columnFilter(filter, part);
  if (part !== 'area' && (kind === 'text' || CLASS_COLUMNS.includes(part))) {
    return (
      <WordChoices
        schemeId={schemeId}
        field={part}
        chosen={chosen.any ?? []}
        onChoose={(any) => {
          onFilter(withColumn(filter, part, { any }));
        }}
      />
    );
  }
  return (
    <NumberRange
      unit={unit}
      mayBeUnknown={part !== 'area'}
      chosen={chosen}
      onChoose={(next) => {
        onFilter(withColumn(filter, part, next));
        close();
      }}
    />
  );
}

function useImportName(schemeId: string, importId: string | undefined): string | undefined {
  const { data } = useQuery({ ...importsQuery(schemeId), enabled: importId !== undefined });
  return data?.find(({ id }) => id === importId)?.fileName;
}

/** What the register is filtered by, one chip each; those that were set or added stand beside the usual. */
export function FilterBar(props: FilterBarProps) {
  const { schemeId, filter, onFilter } = props;
  const [added, setAdded] = useState<FilterPart | null>(null);
  const importName = useImportName(schemeId, filter.importId);
  const shown = [
    ...STANDING_PARTS,
    ...FILTER_PARTS.filter((part) => !isStanding(part) && (isSet(filter, part) || part === added)),
  ];
  const addable = FILTER_PARTS.filter((part) => !isByHand(part) && !shown.includes(part));
  const isFiltered = JSON.stringify(filter) !== '{}';
  return (
    <div role="group" aria-label="Filter" className="flex flex-wrap items-center gap-1.5">
      {shown.map((part) => (
        <FilterChip
          key={part}
          label={partLabel(part)}
          words={partWords(filter, part, importName)}
          isSet={isSet(filter, part)}
          startsOpen={part === added}
          onRemove={() => {
            if (part === added) setAdded(null);
            onFilter(without(filter, part));
          }}
        >
          {(close) => <PartChoices {...props} part={part} close={close} />}
        </FilterChip>
      ))}
      <Menu button="Add a filter" buttonClassName={ADD} align="left">
        {addable.map((part) => (
          <button
            key={part}
            type="button"
            className={MENU_LINE}
            onClick={() => {
              setAdded(part);
            }}
          >
            {partLabel(part)}
          </button>
        ))}
      </Menu>
      {isFiltered && (
        <Button
          kind="quiet"
          className="h-[26px]"
          onClick={() => {
            setAdded(null);
            onFilter({});
          }}
        >
          Clear
        </Button>
      )}
    </div>
  );
}
