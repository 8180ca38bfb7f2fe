// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { SettingsPage } from '../../../../src/screens/study/settings/SettingsPage.tsx';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

describe('settings', () => {
  it('keep the colours of this tablet', async () => {
    const services = fakeServices();
    await studyWithClass(services);
    renderScreen(<SettingsPage />, services, '/study/settings');
    await userEvent.click(await screen.findByRole('radio', { name: 'Dim' }));
    await waitFor(async () => expect(must(await services.store.settings()).theme).toBe('dim'));
  });

  it('remove a study only after its name was typed, and say what would go with it', async () => {
    const services = fakeServices();
    const { study } = await studyWithClass(services);
    renderScreen(<SettingsPage />, services, '/study/settings');
    await userEvent.click(await screen.findByRole('button', { name: 'Remove the study …' }));
    expect(await screen.findByText(/1 class and 0 sessions go with it/)).toBeTruthy();
    const remove = screen.getByRole('button', { name: 'Remove the study for good' });
    expect(remove.getAttribute('aria-disabled')).toBe('true');
    await userEvent.click(remove);
    expect(document.activeElement).toBe(screen.getByLabelText(/^Type the name of the study/));
    await userEvent.type(screen.getByLabelText(/Type the name of the study/), study.name);
    await userEvent.click(remove);
    await waitFor(async () => expect(must(await services.store.studies())).toEqual([]));
  });
});
