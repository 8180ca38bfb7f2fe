// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { MeasureLine } from '../../../src/screens/methods/MeasureLine.tsx';
import { Methods } from '../../../src/screens/methods/Methods.tsx';
import { ServicesContext } from '../../../src/screens/services.ts';
import { measures } from '../../../src/stats/index.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';

afterEach(cleanup);

test('every measure is worked out here and equals its published value', async () => {
  renderScreen(<Methods />, fakeServices(), '/study/methods');
  expect(
    await screen.findByRole(
      'heading',
      { level: 1, name: `All ${measures.length} measures give their expected values on this device.` },
      { timeout: 20_000 },
    ),
  ).toBeTruthy();
  expect(screen.getAllByRole('heading', { level: 2 }).map((one) => one.textContent)).toEqual(
    measures.map(({ name }) => name),
  );
});

test('a value outside the tolerance is said so', () => {
  const [about] = measures;
  if (about === undefined) throw new Error('no measures');
  render(
    <ServicesContext value={fakeServices()}>
      <ul>
        <MeasureLine about={about} check={{ got: 99, equal: false }} />
      </ul>
    </ServicesContext>,
  );
  expect(screen.getAllByText(/not equal/).length).toBeGreaterThan(0);
});
