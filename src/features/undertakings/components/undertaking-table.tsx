import { useState } from 'react';
import type { Undertaking } from '../../../../shared/schemas/undertakings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Facts } from '../../../components/ui/facts.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { ShortWords } from '../../../components/ui/table/short-words.tsx';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { DueDay } from '../../matters/components/due-day.tsx';
import { madeToWords, stretchWords, undertakingState } from '../undertaking-words.ts';
import { BuildingLink } from '../../buildings/components/building-link.tsx';

function For({ schemeId, undertaking }: { schemeId: string; undertaking: Undertaking }) {
  const { building, stretch } = undertaking;
  return (
    <>
      {building !== null && <BuildingLink {...{ schemeId, building }} />}
      {building !== null && stretch !== null && ', '}
      {stretch !== null && stretchWords(stretch)}
    </>
  );
}

function columnsOf(schemeId: string): readonly Column<Undertaking>[] {
  return [
    {
      id: 'promise',
      heading: 'Promise',
      wide: true,
      cell: ({ promise }) => <b className="font-semibold">{promise}</b>,
    },
    {
      id: 'madeTo',
      heading: 'Made to',
      spare: true,
      cell: (undertaking) => <ShortWords words={madeToWords(undertaking)} />,
    },
    {
      id: 'for',
      heading: 'For',
      spare: true,
      cell: (undertaking) => <For {...{ schemeId, undertaking }} />,
    },
    {
      id: 'responsible',
      heading: 'Who sees to it',
      spare: true,
      cell: ({ responsible }) => <ShortWords words={responsible} />,
    },
    { id: 'due', heading: 'Due', cell: DueDay },
    {
      id: 'state',
      heading: 'State',
      spare: true,
      cell: (undertaking) => {
        const { shape, words } = undertakingState(undertaking);
        return <StateMark state={shape}>{words}</StateMark>;
      },
    },
  ];
}

type DetailProps = {
  readonly schemeId: string;
  readonly undertaking: Undertaking;
  readonly onChange: (() => void) | undefined;
};

function Detail({ schemeId, undertaking, onChange }: DetailProps) {
  const { number, promise, source, responsible, doneOn, evidence } = undertaking;
  return (
    <div className="max-w-[72ch] py-2 whitespace-normal">
      <Facts
        facts={[
          ['Number', number],
          ['Promise', <span key="promise" className="whitespace-pre-line">{promise}</span>], // prettier-ignore
          ['Made to', madeToWords(undertaking)],
          ['Source', source],
          ['For', <For key="for" {...{ schemeId, undertaking }} />],
          ['Who sees to it', responsible],
          ['Done', doneOn === null ? 'Not yet' : formatDay(doneOn)],
          ...(evidence === '' ? [] : [['Evidence', evidence] as const]),
        ]}
      />
      {onChange !== undefined && (
        <Button className="mt-2" onClick={onChange}>
          {doneOn === null ? 'Change or say it is done…' : 'Change…'}
        </Button>
      )}
    </div>
  );
}

type UndertakingTableProps = {
  readonly schemeId: string;
  readonly undertakings: readonly Undertaking[];
  readonly onChange: ((undertaking: Undertaking) => void) | undefined;
};

/** Undertakings line by line, overdue ones at the top; a line opens on all that is known. */
export function UndertakingTable({ schemeId, undertakings, onChange }: UndertakingTableProps) {
  const [openId, setOpenId] = useState<string>();
  return (
    <Table
      label="Undertakings"
      wide
      columns={columnsOf(schemeId)}
      rows={undertakings}
      idOf={({ id }) => id}
      onOpen={({ id }) => {
        setOpenId(id === openId ? undefined : id);
      }}
      detailOf={(undertaking) =>
        undertaking.id === openId ? (
          <Detail
            {...{ schemeId, undertaking }}
            onChange={
              onChange &&
              (() => {
                onChange(undertaking);
              })
            }
          />
        ) : undefined
      }
    />
  );
}
