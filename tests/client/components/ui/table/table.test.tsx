import { fireEvent, render, screen, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Column } from '../../../../../src/components/ui/table/column.ts';
import { Table } from '../../../../../src/components/ui/table/table.tsx';
import { axeFaults } from '../../../../support/axe-faults.ts';

type Building = { readonly reference: string; readonly settlement: number };

const COLUMNS: readonly Column<Building>[] = [
  {
    id: 'reference',
    heading: 'Ref',
    sortBy: ({ reference }) => reference,
    cell: ({ reference }) => reference,
  },
  {
    id: 'settlement',
    heading: 'Settlement',
    unit: 'mm',
    holds: 'figure',
    sortBy: ({ settlement }) => settlement,
    cell: ({ settlement }) => settlement.toFixed(1),
  },
  {
    id: 'held',
    heading: 'Held because',
    spare: true,
    wide: true,
    cell: () => <a href="#why">why</a>,
  },
];

const THREE: readonly Building[] = [
  { reference: 'B0290', settlement: 25 },
  { reference: 'B0289', settlement: 9.5 },
  { reference: 'B0291', settlement: 29 },
];

const BUILDINGS = { label: 'Buildings', columns: COLUMNS, idOf: (row: Building) => row.reference };

function references(): (string | null | undefined)[] {
  return screen
    .getAllByRole('row')
    .slice(1)
    .map((row) => row.firstElementChild?.textContent);
}

function focused(): string | null | undefined {
  return document.activeElement?.firstElementChild?.textContent;
}

function press(key: string): void {
  fireEvent.keyDown(document.activeElement ?? document.body, { key });
}

describe('Table', () => {
  it('has its unit under the heading and its figures to the right', async () => {
    render(<Table {...BUILDINGS} rows={THREE} />);
    const heading = screen.getByRole('columnheader', { name: 'Settlement mm' });
    expect(heading.querySelector('small')?.textContent).toBe('mm');
    expect(screen.getByText('29.0').className).toContain('text-right');
    expect(screen.getByRole('table', { name: 'Buildings' }).ariaRowCount).toBe('4');
    expect(await axeFaults()).toEqual([]);
  });

  it('is sorted by a press on a heading, the other way round by the next', () => {
    render(<Table {...BUILDINGS} rows={THREE} sortedBy={{ id: 'reference', desc: false }} />);
    expect(references()).toEqual(['B0289', 'B0290', 'B0291']);
    fireEvent.click(screen.getByRole('button', { name: /Settlement/ }));
    expect(references()).toEqual(['B0289', 'B0290', 'B0291']);
    const heading = screen.getByRole('columnheader', { name: /Settlement/ });
    expect(heading.ariaSort).toBe('ascending');
    fireEvent.click(screen.getByRole('button', { name: /Settlement/ }));
    expect(references()).toEqual(['B0291', 'B0290', 'B0289']);
    expect(heading.ariaSort).toBe('descending');
  });

  it('is walked by J and K and opened by Enter', () => {
    const onOpen = vi.fn();
    render(<Table {...BUILDINGS} rows={THREE} onOpen={onOpen} />);
    press('j');
    expect(focused()).toBe('B0290');
    press('j');
    press('j');
    press('j');
    expect(focused()).toBe('B0291');
    press('k');
    press('Enter');
    expect(onOpen).toHaveBeenCalledWith(THREE[1]);
    press('ArrowUp');
    expect(focused()).toBe('B0290');
    press('o');
    expect(onOpen).toHaveBeenLastCalledWith(THREE[0]);
    expect(screen.getAllByRole('row').map((row) => row.tabIndex)).toEqual([-1, 0, -1, -1]);
  });

  it('opens a row that is pressed, but not by what can be pressed inside', () => {
    const onOpen = vi.fn();
    render(<Table {...BUILDINGS} rows={THREE} onOpen={onOpen} />);
    fireEvent.click(screen.getAllByText('why')[0] ?? document.body);
    expect(onOpen).not.toHaveBeenCalled();
    fireEvent.click(screen.getByText('25.0'));
    expect(onOpen).toHaveBeenCalledWith(THREE[0]);
  });

  it('shows what stands under an opened row', () => {
    const detailOf = ({ reference }: Building) => (reference === 'B0289' ? 'Its walls' : undefined);
    render(<Table {...BUILDINGS} rows={THREE} detailOf={detailOf} />);
    const detail = screen.getByText('Its walls').closest('tbody') ?? document.body;
    expect(within(detail).getByText('B0289')).toBeTruthy();
    expect(screen.getAllByText('Its walls')).toHaveLength(1);
  });

  it('can be scrolled by keyboard where no row can be opened', () => {
    render(<Table {...BUILDINGS} rows={THREE} />);
    expect(screen.getByRole('region', { name: 'Buildings' }).tabIndex).toBe(0);
  });
});

describe('a table of many rows', () => {
  const many = Array.from({ length: 300 }, (_, index) => ({
    reference: `B${String(index).padStart(4, '0')}`,
    settlement: index,
  }));

  beforeEach(() => {
    // jsdom lays nothing out: a table 600 px high with rows of 30
    vi.spyOn(Element.prototype, 'clientHeight', 'get').mockReturnValue(600);
    vi.spyOn(HTMLElement.prototype, 'offsetHeight', 'get').mockReturnValue(30);
  });

  it('has only those in view in the page, and tells how many there are', () => {
    render(<Table {...BUILDINGS} rows={many} />);
    const rows = screen.getAllByRole('row');
    expect(rows.length).toBeGreaterThan(20);
    expect(rows.length).toBeLessThan(60);
    expect(screen.getByRole('table').ariaRowCount).toBe('301');
    expect(rows[1]?.getAttribute('aria-rowindex')).toBe('2');
  });

  it('has all of them on paper, and those in view afterwards', () => {
    render(<Table {...BUILDINGS} rows={many} />);
    fireEvent(window, new Event('beforeprint'));
    expect(references()).toHaveLength(300);
    expect(screen.queryByText(/Left out/)).toBeNull();
    fireEvent(window, new Event('afterprint'));
    expect(references().length).toBeLessThan(60);
  });

  it('says on paper how many are left out of very many', () => {
    const rows = Array.from({ length: 2345 }, (_, index) => ({
      reference: `B${String(index).padStart(4, '0')}`,
      settlement: index,
    }));
    render(<Table {...BUILDINGS} columns={COLUMNS.slice(0, 1)} rows={rows} />);
    fireEvent(window, new Event('beforeprint'));
    expect(screen.getByRole('table').querySelectorAll('[data-row]')).toHaveLength(2000);
    expect(screen.getByText('The first 2 000 rows are printed. Left out: 345.')).toBeTruthy();
    fireEvent(window, new Event('afterprint'));
    expect(screen.queryByText(/Left out/)).toBeNull();
  });
});
