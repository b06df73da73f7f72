import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { Button } from '../../../../src/components/ui/button.tsx';

describe('Button', () => {
  it('is pressed, and sends no form by accident', () => {
    const onClick = vi.fn();
    render(<Button onClick={onClick}>Save</Button>);
    const button = screen.getByRole('button', { name: 'Save' });
    fireEvent.click(button);
    expect(onClick).toHaveBeenCalledOnce();
    expect(button.getAttribute('type')).toBe('button');
  });

  it('keeps its place and takes no second press while it is busy', () => {
    const onClick = vi.fn();
    const onSubmit = vi.fn((event: Event) => {
      event.preventDefault();
    });
    render(
      <form ref={(form) => form?.addEventListener('submit', onSubmit)}>
        <Button type="submit" busy onClick={onClick}>
          Save
        </Button>
      </form>,
    );
    const button = screen.getByRole('button');
    button.focus();
    fireEvent.click(button);
    expect(onClick).not.toHaveBeenCalled();
    expect(onSubmit).not.toHaveBeenCalled();
    expect(button.getAttribute('aria-disabled')).toBe('true');
    expect(document.activeElement).toBe(button);
  });
});
