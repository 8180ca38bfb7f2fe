// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { StudyPages } from '../../../../src/screens/study/StudyPages.tsx';
import { prepareVisit } from '../../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

async function typeInto(label: string | RegExp, text: string) {
  const field = screen.getByLabelText(label);
  await userEvent.clear(field);
  await userEvent.type(field, text);
}

describe('a protocol', () => {
  it('says at once what it comes to, and warns without standing in the way', async () => {
    const services = fakeServices();
    const { study } = await studyWithClass(services);
    renderScreen(<StudyPages />, services, '/study/protocols/new');
    expect(
      await screen.findByText(/^10 looks at each of 6 children in a part of 15 minutes\.$/),
    ).toBeTruthy();
    await typeInto('Interval, in seconds', '45');
    expect(screen.getByText(/More than 30 seconds between looks/)).toBeTruthy();
    expect(screen.getByText(/Fewer than 10 looks at a child/)).toBeTruthy();
    await typeInto('Name of the protocol', 'Slow looks');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this protocol' }));
    await waitFor(async () => {
      const kept = must(await services.store.protocols(study.id)).find((one) => one.name === 'Slow looks');
      expect(kept).toMatchObject({ version: 1, intervalMs: 45_000 });
    });
  });

  it('is changed in place while nobody has used it, and becomes a new version afterwards', async () => {
    const services = fakeServices();
    const { classroom, protocol } = await studyWithClass(services);
    const view = renderScreen(<StudyPages />, services, `/study/protocol/${protocol.id}`);
    await screen.findByText(/Nobody has used this version yet/);
    view.unmount();
    const wish = {
      classroom: classroom.id,
      protocol: { id: protocol.id },
      phases: ['before'],
      absent: [],
      plannedStart: null,
    };
    must(await prepareVisit(services.deps, wish));
    renderScreen(<StudyPages />, services, `/study/protocol/${protocol.id}`);
    await screen.findByText(/Version 1 was used and stays as it is/);
    await typeInto('Interval, in seconds', '20');
    await userEvent.click(screen.getByRole('button', { name: 'Keep as version 2' }));
    await waitFor(async () => {
      const versions = must(await services.store.protocolVersions(protocol.id));
      expect(versions.map((one) => [one.version, one.intervalMs]).sort()).toEqual([
        [1, 15_000],
        [2, 20_000],
      ]);
    });
  });

  it('keeps what does not fit in its field, with a sentence, and keeps nothing else', async () => {
    const services = fakeServices();
    const { study } = await studyWithClass(services);
    renderScreen(<StudyPages />, services, '/study/protocols/new');
    await screen.findByText('How to watch');
    const before = must(await services.store.protocols(study.id)).length;
    await typeInto('Name of the protocol', 'Too quick');
    await typeInto('Interval, in seconds', '1');
    expect(screen.getByText('A number from 3 to 600 is needed.')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Keep this protocol' }));
    expect(await screen.findByText(/Some entries do not fit yet/)).toBeTruthy();
    expect(must(await services.store.protocols(study.id))).toHaveLength(before);
  });
});
