// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { StudyPages } from '../../../../src/screens/study/StudyPages.tsx';
import { removeProtocol, saveProtocol, switchMethod, undoDraw } from '../../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

async function classWithHeadcount({ only }: { only: boolean }) {
  const services = fakeServices();
  const { study, classroom } = await studyWithClass(services);
  must(await undoDraw(services.deps, classroom.id));
  for (const protocol of must(await services.store.protocols(study.id))) {
    if (protocol.method === 'momentary') {
      const { version: _v, removed: _r, revision: _n, ...draft } = protocol;
      const counting = { ...switchMethod(draft, 'headcount'), id: null, name: 'Counting' };
      must(await saveProtocol(services.deps, counting));
    }
    if (only) must(await removeProtocol(services.deps, protocol.id));
  }
  renderScreen(<StudyPages />, services, `/study/class/${classroom.id}`);
}

it('draws for the protocols that watch single children, not for a headcount', async () => {
  await classWithHeadcount({ only: false });
  expect(await screen.findByText('For a headcount nobody has to be drawn.')).toBeTruthy();
  expect(screen.queryByRole('radio', { name: /Counting/ })).toBeNull();
  expect(screen.getByRole('button', { name: 'Draw 6 and 2 in reserve' })).toBeTruthy();
});

it('offers no draw where there are headcounts only', async () => {
  await classWithHeadcount({ only: true });
  expect(await screen.findByText('A headcount looks at everybody: nobody has to be drawn.')).toBeTruthy();
  expect(screen.queryByRole('button', { name: /^Draw/ })).toBeNull();
});
