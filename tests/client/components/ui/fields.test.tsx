import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { Checkbox } from '../../../../src/components/ui/checkbox.tsx';
import { Field } from '../../../../src/components/ui/field.tsx';
import { PasswordField } from '../../../../src/components/ui/password-field.tsx';
import { Select } from '../../../../src/components/ui/select.tsx';
import { TextArea } from '../../../../src/components/ui/text-area.tsx';
import { axeFaults } from '../../../support/axe-faults.ts';

function describedBy(element: Element): (string | null | undefined)[] {
  const ids = element.getAttribute('aria-describedby')?.split(' ') ?? [];
  return ids.map((id) => document.getElementById(id)?.textContent);
}

describe('Field', () => {
  it('says its unit with its label and takes a figure', () => {
    render(<Field label="Settlement" unit="mm" />);
    const input = screen.getByLabelText('Settlement, mm');
    expect(input.getAttribute('inputmode')).toBe('decimal');
  });

  it('ties its hint and its error to the input', async () => {
    render(<Field label="Name" hint="As on the drawing." error="Give it a name." />);
    const input = screen.getByLabelText('Name');
    expect(input.getAttribute('aria-invalid')).toBe('true');
    expect(describedBy(input)).toEqual(['As on the drawing.', 'Give it a name.']);
    expect(await axeFaults()).toEqual([]);
  });

  it('is not invalid without an error', () => {
    render(<Field label="Name" />);
    const input = screen.getByLabelText('Name');
    expect(input.hasAttribute('aria-invalid')).toBe(false);
    expect(input.hasAttribute('aria-describedby')).toBe(false);
  });
});

describe('PasswordField', () => {
  it('hides what is typed until it is asked to show it', () => {
    render(<PasswordField label="Password" />);
    const input = screen.getByLabelText('Password');
    expect(input.getAttribute('type')).toBe('password');
    fireEvent.click(screen.getByRole('button', { name: 'Show the password' }));
    expect(input.getAttribute('type')).toBe('text');
    fireEvent.click(screen.getByRole('button', { name: 'Hide the password' }));
    expect(input.getAttribute('type')).toBe('password');
  });
});

describe('Select', () => {
  it('offers its options, and nothing chosen where that is possible', async () => {
    const options = [{ value: 'a', label: 'Assessor' }];
    render(<Select label="Role" unchosen="None" options={options} error="Choose one." />);
    const names = screen.getAllByRole('option').map(({ textContent }) => textContent);
    expect(names).toEqual(['None', 'Assessor']);
    expect(describedBy(screen.getByLabelText('Role'))).toEqual(['Choose one.']);
    expect(await axeFaults()).toEqual([]);
  });
});

describe('TextArea', () => {
  it('is a labelled field of several lines', () => {
    render(<TextArea label="Description" hint="For who reads the list." />);
    expect(screen.getByLabelText('Description').tagName).toBe('TEXTAREA');
  });
});

describe('Checkbox', () => {
  it('is switched by its words too', async () => {
    const onChange = vi.fn();
    render(<Checkbox label="Administrator" hint="Sees all." checked={false} onChange={onChange} />);
    fireEvent.click(screen.getByText('Administrator'));
    expect(onChange).toHaveBeenCalledOnce();
    expect(describedBy(screen.getByRole('checkbox'))).toEqual(['Sees all.']);
    expect(await axeFaults()).toEqual([]);
  });
});
