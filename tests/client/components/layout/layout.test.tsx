import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { Bar } from '../../../../src/components/layout/bar.tsx';
import { BasisLine } from '../../../../src/components/layout/basis-line.tsx';
import { GoTo } from '../../../../src/components/layout/go-to.tsx';
import { KeysHelp } from '../../../../src/components/layout/keys-help.tsx';
import { Page } from '../../../../src/components/layout/page.tsx';
import { PersonMenu } from '../../../../src/components/layout/person-menu.tsx';
import { SchemeSwitcher } from '../../../../src/components/layout/scheme-switcher.tsx';
import { singleKeysAreOn } from '../../../../src/config/single-keys.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { renderPage } from '../../../support/render-page.tsx';

const TABS = [
  { to: '/schemes/1/plan', label: 'Plan' },
  { to: '/schemes/1/settings', label: 'Settings' },
];

describe('Bar', () => {
  it('leads home, and marks the screen at hand', async () => {
    renderPage(<Bar tabs={TABS}>Assessor 1</Bar>, '/schemes/1/settings/rules');
    expect(screen.getByRole('link', { name: 'Groundsill' }).getAttribute('href')).toBe('/');
    const nav = screen.getByRole('navigation', { name: 'Screens' });
    expect(within(nav).getByRole('link', { current: 'page' }).textContent).toBe('Settings');
    expect(await axeFaults()).toEqual([]);
  });

  it('has no list of screens where there are none', () => {
    renderPage(<Bar tabs={[]}>Owner</Bar>);
    expect(screen.queryByRole('navigation')).toBeNull();
  });
});

describe('BasisLine', () => {
  it('names what a screen rests on, and shows a preview as one', () => {
    renderPage(<BasisLine parts={['Option B, revision 3', 'Run 41']} end="central" preview />);
    const line = screen.getByRole('region', { name: 'What this rests on' });
    expect(line.textContent).toBe('Option B, revision 3Run 41central');
    expect(line.className).toContain('border-dashed');
  });
});

describe('GoTo', () => {
  it('shows what is meant and goes there', () => {
    const onGo = vi.fn();
    const found = [{ to: '/audit', title: 'Audit', note: 'administration' }];
    const shared = { hasKey: true, isOpen: true, query: 'aud', found, onGo };
    const nothing = () => undefined;
    renderPage(<GoTo {...shared} onOpen={nothing} onClose={nothing} onQuery={nothing} />);
    const search = screen.getByRole('combobox');
    expect(document.activeElement).toBe(search);
    fireEvent.keyDown(search, { key: 'Enter' });
    expect(onGo).toHaveBeenCalledWith('/audit');
  });
});

describe('KeysHelp', () => {
  it('lists the keys, and turns single ones off', async () => {
    const help = [{ keys: ['J', 'K'], does: 'Next and previous row' }];
    renderPage(<KeysHelp open help={help} onClose={() => undefined} />);
    expect(screen.getByRole('term').textContent).toBe('JK');
    const single = screen.getByRole('checkbox');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(single);
    expect(singleKeysAreOn()).toBe(false);
    expect(screen.getByRole('checkbox', { checked: false })).toBeTruthy();
  });
});

describe('Page', () => {
  it('names itself in the tab and has one heading', () => {
    renderPage(
      <Page title="People" lead="Three with an account." aside="Invite">
        List
      </Page>,
    );
    expect(document.title).toBe('People · Groundsill');
    expect(screen.getAllByRole('heading')).toHaveLength(1);
    expect(screen.getByRole('complementary').textContent).toBe('Invite');
  });
});

describe('PersonMenu', () => {
  it('is named after the person and signs them out', () => {
    const onSignOut = vi.fn();
    const links = [{ to: '/account', label: 'Account' }];
    const person = { name: 'Assessor 1', links, onSignOut, onShowKeys: () => undefined };
    renderPage(<PersonMenu {...person} />);
    fireEvent.click(screen.getByRole('button', { name: /^Assessor 1/ }));
    expect(screen.getByRole('link', { name: 'Account' })).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Sign out' }));
    expect(onSignOut).toHaveBeenCalledOnce();
  });
});

describe('SchemeSwitcher', () => {
  it('shows the scheme at hand and leads to the others', () => {
    const current = { id: '1', name: 'Port Dogger crossing' };
    const others = [{ id: '2', name: 'North Mole sewer' }];
    renderPage(
      <SchemeSwitcher current={current} others={others} pathOf={(id) => `/schemes/${id}`} />,
    );
    fireEvent.click(screen.getByRole('button', { name: /^Port Dogger crossing/ }));
    const link = screen.getByRole('link', { name: 'North Mole sewer' });
    expect(link.getAttribute('href')).toBe('/schemes/2');
  });
});
