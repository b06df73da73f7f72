import type { ReactNode } from 'react';
import type { RuleSet } from '../../../../shared/schemas/rules.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import { conditionInWords, RULES, ruleValue } from '../rule-words.ts';
import { sourceInFull, sourceWords } from '../source-words.ts';

type Line = {
  readonly id: string;
  readonly name: string;
  readonly what: string;
  readonly value: string;
  readonly source: RuleSet['screening']['source'];
  readonly date: string;
};

function wrapped(content: ReactNode) {
  return <span className="block min-w-[130px] py-1 whitespace-normal">{content}</span>;
}

const SOURCE: Column<Line> = {
  id: 'source',
  heading: 'Source',
  cell: ({ source }) => wrapped(<span title={sourceInFull(source)}>{sourceWords(source)}</span>),
};

const FROM: Column<Line> = {
  id: 'date',
  heading: 'Holds from',
  cell: ({ date }) => formatShortDay(date),
};

const RULE_COLUMNS: readonly Column<Line>[] = [
  {
    id: 'name',
    heading: 'Rule',
    cell: ({ name, what }) =>
      wrapped(
        <>
          <b className="font-semibold">{name}</b>
          <span className="block text-cap text-ink-3">{what}</span>
        </>,
      ),
  },
  { id: 'value', heading: 'In this scheme', wide: true, cell: ({ value }) => wrapped(value) },
  SOURCE,
  FROM,
];

const HOLD_COLUMNS: readonly Column<Line>[] = [
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

/** Rules and holds of one version, each with its source and the day from which it holds. */
export function RulesView({ rules }: { readonly rules: RuleSet }) {
  const ruleLines = RULES.map(({ rule, name, what }) => {
    const { source, date } = rules[rule];
    return { id: rule, name, what, value: ruleValue(rules, rule), source, date };
  });
  const holdLines = rules.holds.map(({ name, condition, stages, source, date }) => ({
    id: name,
    name,
    what: stages.join(' and '),
    value: conditionInWords(condition),
    source,
    date,
  }));
  return (
    <>
      <Table label="Rules in force" columns={RULE_COLUMNS} rows={ruleLines} idOf={({ id }) => id} />
      <Panel title="Holds" note="keep a building from being let go, whatever its figures">
        <Table
          label="What holds a building"
          columns={HOLD_COLUMNS}
          rows={holdLines}
          idOf={({ id }) => id}
        />
      </Panel>
    </>
  );
}
