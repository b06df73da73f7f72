import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { FileButton } from '../../../../src/components/ui/file-button.tsx';
import { Menu } from '../../../../src/components/ui/menu.tsx';
import { SearchList } from '../../../../src/components/ui/search-list.tsx';
import { Segments } from '../../../../src/components/ui/segments.tsx';
import { axeFaults } from '../../../support/axe-faults.ts';

describe('Menu', () => {
  function openMenu(onPress = () => undefined) {
    render(
      <>
        <Menu button="Administrator" align="right">
          <button onClick={onPress}>Sign out</button>
        </Menu>
        <button>Elsewhere</button>
      </>,
    );
    const button = screen.getByRole('button', { name: 'Administrator' });
    fireEvent.click(button);
    expect(button.ariaExpanded).toBe('true');
    return button;
  }

  it('closes on Esc and gives the focus back', () => {
    const button = openMenu();
    fireEvent.keyDown(document.body, { key: 'Escape' });
    expect(screen.queryByText('Sign out')).toBeNull();
    expect(document.activeElement).toBe(button);
  });

  it('closes by a press or a step outside, and after one of its lines', () => {
    const onPress = vi.fn();
    const button = openMenu(onPress);
    fireEvent.pointerDown(screen.getByText('Elsewhere'));
    expect(screen.queryByText('Sign out')).toBeNull();
    fireEvent.click(button);
    fireEvent.focusIn(screen.getByText('Elsewhere'));
    expect(screen.queryByText('Sign out')).toBeNull();
    fireEvent.click(button);
    fireEvent.click(screen.getByText('Sign out'));
    expect(onPress).toHaveBeenCalledOnce();
    expect(screen.queryByText('Sign out')).toBeNull();
  });
});

describe('SearchList', () => {
  const found = [
    { id: 'a', title: 'Plan', note: 'Port Dogger' },
    { id: 'b', title: 'Settings' },
  ];

  function Searching({ onChoose, nothing }: { onChoose: (id: string) => void; nothing?: string }) {
    const [query, setQuery] = useState('');
    const props = { label: 'Go to', query, onQuery: setQuery, onChoose };
    return <SearchList {...props} found={nothing ? [] : found} nothing={nothing ?? ''} />;
  }

  it('is walked by arrows, round its ends, and taken by Enter', async () => {
    const onChoose = vi.fn();
    render(<Searching onChoose={onChoose} />);
    const input = screen.getByRole('combobox', { name: 'Go to' });
    const reached = () =>
      document.getElementById(input.getAttribute('aria-activedescendant') ?? '');
    expect(reached()?.textContent).toBe('PlanPort Dogger');
    fireEvent.keyDown(input, { key: 'ArrowDown' });
    expect(reached()?.textContent).toBe('Settings');
    expect(screen.getByRole('option', { selected: true })).toBe(reached());
    expect(await axeFaults()).toEqual([]);
    fireEvent.keyDown(input, { key: 'ArrowDown' });
    fireEvent.keyDown(input, { key: 'ArrowUp' });
    fireEvent.keyDown(input, { key: 'Enter' });
    expect(onChoose).toHaveBeenLastCalledWith('b');
    fireEvent.click(screen.getByText('Plan'));
    expect(onChoose).toHaveBeenLastCalledWith('a');
  });

  it('begins at the first again when the query changes', () => {
    const onChoose = vi.fn();
    render(<Searching onChoose={onChoose} />);
    const input = screen.getByRole('combobox');
    fireEvent.keyDown(input, { key: 'ArrowDown' });
    fireEvent.change(input, { target: { value: 'p' } });
    fireEvent.keyDown(input, { key: 'Enter' });
    expect(onChoose).toHaveBeenCalledWith('a');
  });

  it('says aloud that nothing is found, and takes nothing', () => {
    const onChoose = vi.fn();
    render(<Searching onChoose={onChoose} nothing="Nothing here has this name." />);
    expect(screen.getByRole('status').textContent).toBe('Nothing here has this name.');
    fireEvent.keyDown(screen.getByRole('combobox'), { key: 'Enter' });
    expect(onChoose).not.toHaveBeenCalled();
  });
});

describe('Segments', () => {
  it('show which of them is chosen', () => {
    const onChange = vi.fn();
    const segments = [
      { value: 'text', label: 'As text' },
      { value: 'sent', label: 'As it looks' },
    ] as const;
    render(<Segments label="Show" segments={segments} value="text" onChange={onChange} />);
    expect(screen.getByRole('button', { pressed: true }).textContent).toBe('As text');
    fireEvent.click(screen.getByText('As it looks'));
    expect(onChange).toHaveBeenCalledWith('sent');
  });
});

describe('FileButton', () => {
  it('hands on each file, the same one again too', () => {
    const onFile = vi.fn();
    render(
      <FileButton label="Bring in a file for water" accept=".zip" onFile={onFile}>
        Bring in a file
      </FileButton>,
    );
    const input = screen.getByLabelText('Bring in a file for water', { selector: 'input' });
    const file = new File(['x'], 'water.zip');
    fireEvent.change(input, { target: { files: [file] } });
    fireEvent.change(input, { target: { files: [] } });
    fireEvent.change(input, { target: { files: [file] } });
    expect(onFile.mock.calls).toEqual([[file], [file]]);
  });
});
