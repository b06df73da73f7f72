import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { RulesPage } from '../../../../src/app/routes/settings-rules.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aRulesVersion, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const RULES = `/api/schemes/${anId(10)}/rules`;

function openRules(abilities: Record<string, boolean>) {
  const scheme = aSchemeAnswer({ abilities: { readRules: true, ...abilities } });
  renderPage(
    <SchemeContext value={scheme}>
      <RulesPage />
    </SchemeContext>,
  );
}

describe('the page of rules', () => {
  it('shows them with their sources to who may read them, and no way to change them', async () => {
    fakeApi({ [`GET ${RULES}`]: [aRulesVersion()] });
    openRules({});
    const table = await screen.findByRole('table', { name: 'Rules in force' });
    expect(within(table).getByText('Rankin 1988')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Change the rules' })).toBeNull();
    const reasons = within(screen.getByRole('table', { name: 'Reasons for scores' }));
    const words = 'Structure 1 Moved or repaired before Common practice 1 May 2026';
    expect(reasons.getByRole('row', { name: words })).toBeTruthy();
  });

  it('saves the reasons for scores with the rest', async () => {
    const { calls } = fakeApi({
      [`GET ${RULES}`]: [aRulesVersion()],
      [`POST ${RULES}`]: aRulesVersion({ version: 2 }),
    });
    openRules({ updateRules: true });
    fireEvent.click(await screen.findByRole('button', { name: 'Change the rules' }));
    fireEvent.click(screen.getByRole('button', { name: 'Remove reason 1 for structure' }));
    fireEvent.click(screen.getByRole('button', { name: 'Another reason for features' }));
    const features = within(screen.getByRole('group', { name: 'Features' }));
    fireEvent.change(features.getAllByLabelText('Because').at(-1) ?? document.body, {
      target: { value: 'Organ' },
    });
    fireEvent.change(features.getAllByLabelText('Score').at(-1) ?? document.body, {
      target: { value: '2' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 2' }));
    const { value } = aRulesVersion().rules.sensitivity;
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toMatchObject({
        rules: {
          sensitivity: {
            value: {
              structure: value.structure.slice(1),
              features: [...value.features, { score: 2, reason: 'Organ' }],
            },
          },
        },
      });
    });
  });

  it('is not there for who may not', () => {
    openRules({ readRules: false });
    expect(screen.getByRole('heading', { name: 'Nothing here' })).toBeTruthy();
  });

  it('saves the next version, made from the newest', async () => {
    const { calls } = fakeApi({
      [`GET ${RULES}`]: [aRulesVersion()],
      [`POST ${RULES}`]: aRulesVersion({ version: 2 }),
    });
    openRules({ updateRules: true });
    fireEvent.click(await screen.findByRole('button', { name: 'Change the rules' }));
    const [settlement] = screen.getAllByLabelText('Settlement, mm');
    fireEvent.change(settlement ?? document.body, { target: { value: '12,5' } });
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 2' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toMatchObject({
        basedOn: 1,
        rules: { screening: { value: { settlement: 0.0125, slope: 0.002 } } },
      });
    });
    expect(await screen.findByRole('button', { name: 'Change the rules' })).toBeTruthy();
  });

  it('keeps what was written when somebody else was faster', async () => {
    fakeApi({
      [`GET ${RULES}`]: [aRulesVersion()],
      [`POST ${RULES}`]: new Refusal(409, 'conflict', 'Somebody else changed this meanwhile.'),
    });
    openRules({ updateRules: true });
    fireEvent.click(await screen.findByRole('button', { name: 'Change the rules' }));
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 2' }));
    expect((await screen.findByRole('alert')).textContent).toContain('Somebody else');
    expect(screen.getByRole('button', { name: 'Save as version 2' })).toBeTruthy();
  });

  it('shows the change of who was faster and lays what was written on it', async () => {
    const first = aRulesVersion();
    const focus = { ...first.rules.focus, value: 'deep' } as const;
    const second = aRulesVersion({ version: 2, rules: { ...first.rules, focus } });
    const kept = [first];
    const { calls } = fakeApi({
      [`GET ${RULES}`]: () => kept,
      [`POST ${RULES}`]: (body: unknown) => {
        if (JSON.stringify(body).includes('"basedOn":2')) return aRulesVersion({ version: 3 });
        kept.unshift(second);
        return new Refusal(409, 'conflict', 'Somebody else changed this meanwhile.');
      },
    });
    openRules({ updateRules: true });
    fireEvent.click(await screen.findByRole('button', { name: 'Change the rules' }));
    const [settlement] = screen.getAllByLabelText('Settlement, mm');
    fireEvent.change(settlement ?? document.body, { target: { value: '12' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 2' }));
    const alert = await screen.findByRole('alert');
    await waitFor(() => {
      expect(document.activeElement).toBe(alert);
    });
    fireEvent.click(await screen.findByRole('button', { name: 'See their change' }));
    expect(screen.getByRole('table', { name: 'Their change' }).textContent).toContain(
      'a point below the axis',
    );
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Keep mine on top of it' }));
    expect(screen.queryByRole('alert')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 3' }));
    await waitFor(() => {
      expect(calls.findLast(({ route }) => route.startsWith('POST'))?.body).toMatchObject({
        basedOn: 2,
        rules: { screening: { value: { settlement: 0.012 } }, focus: { value: 'deep' } },
      });
    });
  });

  it('marks what is wrong and saves nothing', async () => {
    const { calls } = fakeApi({ [`GET ${RULES}`]: [aRulesVersion()] });
    openRules({ updateRules: true });
    fireEvent.click(await screen.findByRole('button', { name: 'Change the rules' }));
    const [settlement] = screen.getAllByLabelText('Settlement, mm');
    fireEvent.change(settlement ?? document.body, { target: { value: 'twelve' } });
    fireEvent.click(screen.getByRole('button', { name: 'Another hold' }));
    fireEvent.click(screen.getByRole('button', { name: 'Save as version 2' }));
    expect(await screen.findByText('Give a figure, such as 12.5.')).toBeTruthy();
    expect(screen.getByText('Give it a name.')).toBeTruthy();
    expect(calls).toHaveLength(1);
  });

  it('shows an older version and what the newer one changed', async () => {
    const first = aRulesVersion();
    const focus = { ...first.rules.focus, value: 'deep' } as const;
    const second = aRulesVersion({ version: 2, rules: { ...first.rules, focus } });
    fakeApi({ [`GET ${RULES}`]: [second, first] });
    openRules({ updateRules: true });
    const changes = await screen.findByRole('table', { name: 'What version 2 changed' });
    expect(changes.textContent).toContain('a point below the axis');
    fireEvent.click(screen.getByRole('button', { name: /^Version 1/ }));
    expect(screen.queryByRole('table', { name: /changed/ })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Change the rules' })).toBeNull();
  });
});
