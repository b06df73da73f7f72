import type { ReactNode } from 'react';
import type { RuleSet } from '../../../../shared/schemas/rules.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { formatShortDay } from '../../../lib/format-date.ts';
import { holdLines, reasonLines, ruleLines, type RuleLine } from '../rule-lines.ts';
import { sourceInFull, sourceWords } from '../../../../shared/presentation/source-words.ts';

const NAME_ROOM = 'min-w-[130px] sm:min-w-[190px]';

function wrapped(content: ReactNode, room = 'min-w-[130px]') {
  return <span className={classNames('block py-1 whitespace-normal', room)}>{content}</span>;
}

const SOURCE: Column<RuleLine> = {
  id: 'source',
  heading: 'Source',
  cell: ({ source }) => wrapped(<span title={sourceInFull(source)}>{sourceWords(source)}</span>),
};

const FROM: Column<RuleLine> = {
  id: 'date',
  heading: 'Holds from',
  cell: ({ date }) => formatShortDay(date),
};

const RULE_COLUMNS: readonly Column<RuleLine>[] = [
  {
    id: 'name',
    heading: 'Rule',
    cell: ({ name, what }) =>
      wrapped(
        <>
          <b className="font-semibold">{name}</b>
          <span className="block text-cap text-ink-3">{what}</span>
        </>,
        NAME_ROOM,
      ),
  },
  { id: 'value', heading: 'In this scheme', wide: true, cell: ({ value }) => wrapped(value) },
  SOURCE,
  FROM,
];

const HOLD_COLUMNS: readonly Column<RuleLine>[] = [
  {
    id: 'name',
    heading: 'Held because',
    cell: ({ name }) => wrapped(<b className="font-semibold">{name}</b>),
  },
  {
    id: 'value',
    heading: 'Acts when the building is',
    wide: true,
    cell: ({ value }) => wrapped(value),
  },
  { id: 'stages', heading: 'At stage', cell: ({ what }) => what },
  SOURCE,
  FROM,
];

const REASON_COLUMNS: readonly Column<RuleLine>[] = [
  { id: 'kind', heading: 'Of', cell: ({ what }) => what },
  { id: 'value', heading: 'Score', holds: 'figure', cell: ({ value }) => value },
  {
    id: 'name',
    heading: 'Because',
    wide: true,
    cell: ({ name }) => wrapped(name),
  },
  SOURCE,
  FROM,
];

/** Rules, holds and reasons of one version, each with its source and the day from which it holds. */
export function RulesView({ rules }: { readonly rules: RuleSet }) {
  return (
    <>
      <Table
        label="Rules in force"
        columns={RULE_COLUMNS}
        rows={ruleLines(rules)}
        idOf={({ id }) => id}
      />
      <Panel title="Holds" note="keep a building from being let go, whatever its figures">
        <Table
          label="What holds a building"
          columns={HOLD_COLUMNS}
          rows={holdLines(rules)}
          idOf={({ id }) => id}
        />
      </Panel>
      <Panel title="Sensitivity scores" note="offered to who scores a building">
        <Table
          label="Reasons for scores"
          columns={REASON_COLUMNS}
          rows={reasonLines(rules)}
          idOf={({ id }) => id}
        />
      </Panel>
    </>
  );
}
