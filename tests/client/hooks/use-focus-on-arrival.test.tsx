import { act, fireEvent, render, screen } from '@testing-library/react';
import { createMemoryRouter, Link, Outlet, RouterProvider } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { Menu } from '../../../src/components/ui/menu.tsx';
import { useFocusOnArrival } from '../../../src/hooks/use-focus-on-arrival.ts';

function Frame() {
  useFocusOnArrival('content');
  return (
    <>
      <Link to="/slow">Slow</Link>
      <Link to="/quick">Quick</Link>
      <Menu align="right" button="Assessor">
        Account
      </Menu>
      <main id="content" tabIndex={-1}>
        <Outlet />
      </main>
    </>
  );
}

/** A page that is fetched when it is opened, and comes when the test lets it. */
function open() {
  let arrive = () => undefined;
  const fetched = new Promise<undefined>((resolve) => {
    arrive = () => {
      resolve(undefined);
      return undefined;
    };
  });
  const Slow = () => <h1>Slow page</h1>;
  const routes = [
    {
      Component: Frame,
      children: [
        { index: true, element: <button type="button">Inside</button> },
        { path: 'quick', element: <h1>Quick page</h1> },
        { path: 'slow', lazy: () => fetched.then(() => ({ Component: Slow })) },
      ],
    },
  ];
  render(<RouterProvider router={createMemoryRouter(routes)} />);
  return {
    arrive: async () => {
      await act(async () => {
        arrive();
        await fetched;
      });
      await screen.findByRole('heading', { name: 'Slow page' });
    },
  };
}

/** Presses something as a pointer does, focus included. */
function press(element: HTMLElement): void {
  fireEvent.pointerDown(element);
  element.focus();
  fireEvent.click(element);
}

function pressLink(name: string): Promise<void> {
  return act(async () => {
    press(screen.getByRole('link', { name }));
    await Promise.resolve();
  });
}

function focused(): string | null | undefined {
  return document.activeElement === screen.getByRole('main')
    ? 'content'
    : document.activeElement?.textContent;
}

describe('useFocusOnArrival', () => {
  it('brings the focus to a page that is there at once', async () => {
    open();
    await pressLink('Quick');
    await screen.findByRole('heading', { name: 'Quick page' });
    expect(focused()).toBe('content');
  });

  it('brings the focus to a page that was waited for', async () => {
    const { arrive } = open();
    await pressLink('Slow');
    expect(focused()).toBe('Slow');
    await arrive();
    expect(focused()).toBe('content');
  });

  it('leaves a menu alone that was opened meanwhile', async () => {
    const { arrive } = open();
    await pressLink('Slow');
    press(screen.getByRole('button', { name: 'Assessor' }));
    await arrive();
    expect(focused()).toBe('Assessor');
    expect(screen.getByText('Account')).toBeTruthy();
  });

  it('leaves a menu alone whose button the browser has not focused', async () => {
    const { arrive } = open();
    await pressLink('Slow');
    act(() => {
      screen.getByRole('link', { name: 'Slow' }).blur();
    });
    fireEvent.pointerDown(screen.getByRole('button', { name: 'Assessor' }));
    fireEvent.click(screen.getByRole('button', { name: 'Assessor' }));
    await arrive();
    expect(screen.getByText('Account')).toBeTruthy();
  });

  it('leaves the focus where the keys have taken it meanwhile', async () => {
    const { arrive } = open();
    await pressLink('Slow');
    fireEvent.keyDown(document.activeElement ?? document.body, { key: 'Tab' });
    screen.getByRole('link', { name: 'Quick' }).focus();
    await arrive();
    expect(focused()).toBe('Quick');
  });

  it('brings the focus to the page where it was lost with the page before', async () => {
    const { arrive } = open();
    await pressLink('Slow');
    fireEvent.keyDown(document.activeElement ?? document.body, { key: 'Tab' });
    screen.getByRole('button', { name: 'Inside' }).focus();
    await arrive();
    expect(focused()).toBe('content');
  });
});
