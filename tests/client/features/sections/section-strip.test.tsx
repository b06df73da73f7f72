import { act, fireEvent, screen, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { createPreviewWork } from '../../../../src/features/alignments/preview/preview-work.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { SectionStrip } from '../../../../src/features/sections/components/section-strip.tsx';
import {
  useSectionDesk,
  useSectionMark,
  type SectionDesk,
} from '../../../../src/features/sections/hooks/use-section-desk.ts';
import type { ShownRun } from '../../../../src/features/sections/shown-categories.ts';
import type { SectionLine } from '../../../../src/features/sections/section-line.ts';
import { DAMAGE } from '../../../../shared/presentation/damage-style.ts';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { aDesign } from '../../../support/designs.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const PERSON = {
  id: anId(),
  name: 'A',
  email: 'a@example.org',
  isAdministrator: false,
  demo: true,
};
const OUTLINES = `GET /api/schemes/${anId(10)}/building-outlines`;
const HOUSE = {
  id: 7,
  reference: 'B-0007',
  name: 'Customs House',
  storeys: 3,
  eavesHeight: 9,
  footprint: [[[[-5, 10], [5, 10], [5, 22], [-5, 22], [-5, 10]]]], // prettier-ignore
};
const DESIGN = aDesign({ volumeLoss: { low: 0.01, central: 0.015, high: 0.02 } });
const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;

/** A line whose thread answers at once. */
function aLine(overrides: Partial<SectionLine> = {}): SectionLine {
  const work = createPreviewWork();
  return {
    design: DESIGN,
    preview: { design: DESIGN, rules: RULES },
    thread: {
      ask: ({ preview, question, onWorked }) => {
        onWorked(work({ preview, question }));
      },
      end: () => undefined,
    },
    isKnown: true,
    options: [],
    mayEdit: true,
    mayBegin: true,
    draw: vi.fn(),
    editor: { isEditing: false, isDrawing: false },
    ...overrides,
  };
}

let desk: SectionDesk;
let marks: number;

const NO_RUN: ShownRun = { shading: null, end: 'central' };

function Desk({ line, shown }: { readonly line: SectionLine; readonly shown: ShownRun }) {
  desk = useSectionDesk(line);
  marks = useSectionMark(desk).length;
  return (
    <main>
      <h1>Plan</h1>
      <SectionStrip desk={desk} selected={null} shown={shown} />
    </main>
  );
}

function show(line = aLine(), shown = NO_RUN) {
  fakeApi({ [OUTLINES]: [HOUSE] });
  return renderPage(
    <PersonContext value={PERSON}>
      <SchemeContext value={aSchemeAnswer()}>
        <Desk line={line} shown={shown} />
      </SchemeContext>
    </PersonContext>,
  );
}

function label(): string | null {
  return screen.getByRole('img').getAttribute('aria-label');
}

beforeEach(() => {
  localStorage.clear();
});

describe('the section across the line', () => {
  it('says its figures, follows who points, and keeps its place when they leave', async () => {
    show();
    await screen.findByText('B-0007');
    expect(label()).toBe(
      'Section across the line at 0+500, scale 1 to 1000, settlement drawn 500 times. ' +
        'Largest settlement 16.9 mm central, 11.3 low, 22.6 high. Trough 0.42 m³/m. ' +
        'One building stands on it.',
    );
    act(() => {
      desk.point([-100, 30]);
    });
    expect(label()).toMatch(/at 0\+400,.* No building stands on it\./);
    act(() => {
      desk.point([-300, 4000]);
    });
    expect(label()).toMatch(/at 0\+400,/);
    expect(await axeFaults(document.body)).toEqual([]);
  });

  it('is stepped by keys and goes to a chainage that is written', () => {
    show();
    fireEvent.keyDown(document.body, { key: '.' });
    expect(label()).toMatch(/at 0\+505,/);
    fireEvent.keyDown(document.body, { key: ',' });
    fireEvent.keyDown(document.body, { key: ',' });
    expect(label()).toMatch(/at 0\+495,/);
    const field = screen.getByLabelText('at chainage');
    fireEvent.change(field, { target: { value: 'here' } });
    expect(field.getAttribute('aria-invalid')).toBe('true');
    fireEvent.change(field, { target: { value: '9+000' } });
    fireEvent.keyDown(field, { key: 'Enter' });
    expect(label()).toMatch(/at 1\+000,/);
  });

  it('is a table behind T', async () => {
    show();
    await screen.findByText('B-0007');
    fireEvent.keyDown(document.body, { key: 't' });
    expect(screen.queryByRole('img')).toBeNull();
    const trough = screen.getByRole('table', { name: /^Settlement across the line/ });
    expect(within(trough).getByRole('row', { name: '0.0 11.3 16.9 22.6' })).toBeTruthy();
    const buildings = screen.getByRole('table', { name: 'Buildings on the section' });
    expect(within(buildings).getByRole('row', { name: 'B-0007 10.0 22.0 9.0' })).toBeTruthy();
    expect(await axeFaults(document.body)).toEqual([]);
  });
});

describe('buildings on the section', () => {
  function house(): HTMLElement {
    const title = screen.getByText(/^B-0007 Customs House/);
    const group = title.closest('g');
    if (group === null) throw new Error('The building is not drawn.');
    return group as unknown as HTMLElement;
  }

  it('take the hatch and number of the category that the map shows, and say it in the table', async () => {
    show(aLine(), { shading: { by: 'category', shades: new Map([[7, 2]]) }, end: 'high' });
    await screen.findByText('B-0007');
    expect(house().querySelector('title')?.textContent).toBe(
      'B-0007 Customs House, category 2, 9.0 m to the eaves',
    );
    expect(within(house()).getByText('2')).toBeTruthy();
    const fill = house().querySelector('path')?.getAttribute('fill') ?? '';
    expect(document.querySelector(fill.replace(/^url\((.*)\)$/, '$1'))?.innerHTML).toContain(
      DAMAGE[2].fill,
    );
    fireEvent.keyDown(document.body, { key: 't' });
    const table = screen.getByRole('table', { name: 'Buildings on the section' });
    expect(within(table).getByRole('columnheader', { name: 'Category high' })).toBeTruthy();
    expect(
      within(table).getByText('Category', { selector: 'td span' }).parentElement?.textContent,
    ).toBe('Category 2, slight');
  });

  it.each([
    ['without a run', NO_RUN],
    ['without a category', { shading: { by: 'category', shades: new Map() }, end: 'low' }],
    ['by stage', { shading: { by: 'stage', shades: new Map([[7, 12]]) }, end: 'central' }],
  ] satisfies [string, ShownRun][])('are plain %s', async (_name, shown) => {
    show(aLine(), shown);
    await screen.findByText('B-0007');
    const path = house().querySelector('path');
    expect([path?.hasAttribute('fill'), path?.getAttribute('class')]).toEqual([
      false,
      'fill-bldg stroke-bldg-edge',
    ]);
  });
});

describe('the section along the line', () => {
  it('says its figures, and has its levels behind T', async () => {
    show();
    fireEvent.click(screen.getByRole('button', { name: 'Along' }));
    expect(label()).toMatch(
      /^Section along the line, 1\u2009000 m, height drawn \d+ times length\. Largest settlement 16\.9 mm central/,
    );
    expect(await axeFaults(document.body)).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Table T' }));
    const levels = screen.getByRole('table', { name: 'Levels along the line' });
    expect(
      within(levels).getByRole('row', { name: '1+000 0.00 −17.00 −20.00 −23.00' }),
    ).toBeTruthy();
  });

  it('says why the method shows nothing', () => {
    const design = aDesign({ line: [[0, 0], [30, 0], [0, 0.01]], bores: { kind: 'twin', spacing: 40, later: 'left', laterFactor: 1 } }); // prettier-ignore
    show(aLine({ design, preview: { design, rules: RULES } }));
    expect(screen.getByText(/^No settlement is shown\./)).toBeTruthy();
  });
});

describe('the strip', () => {
  it('is hidden and shown, as high as it was made, and so the next time', () => {
    const { unmount } = show();
    expect(marks).toBeGreaterThan(0);
    const edge = screen.getByRole('separator', { name: 'Height of the section' });
    fireEvent.keyDown(edge, { key: 'ArrowUp' });
    expect(edge.getAttribute('aria-valuenow')).toBe('216');
    fireEvent.click(screen.getByRole('button', { name: 'Hide the section' }));
    expect([screen.queryByRole('img'), marks]).toEqual([null, 0]);
    unmount();
    show();
    fireEvent.click(screen.getByRole('button', { name: 'Show the section' }));
    expect(screen.getByRole('img').getAttribute('height')).toBe('216');
  });

  it('says what to do where there is no line', () => {
    const draw = vi.fn();
    const { unmount } = show(aLine({ design: null, preview: null, draw }));
    expect(screen.getByText('No line yet. Draw one to see its section.')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Draw the line' }));
    expect(draw).toHaveBeenCalledTimes(1);
    unmount();
    show(aLine({ design: null, preview: null, mayEdit: false, mayBegin: false }));
    expect(screen.getByText(/once a designer has drawn one/)).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Draw the line' })).toBeNull();
  });
});

it('stays low while points are pressed on the map, and is there once the line is ended', async () => {
  const { unmount } = show(aLine({ editor: { isEditing: true, isDrawing: true } }));
  await screen.findByText('End the line to see its section.');
  expect(screen.queryByRole('img')).toBeNull();
  unmount();
  show(aLine({ editor: { isEditing: true, isDrawing: false } }));
  expect(await screen.findByRole('img', { name: /^Section across the line/ })).toBeTruthy();
});
