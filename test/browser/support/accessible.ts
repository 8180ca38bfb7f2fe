import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** Holds the page, as it is shown now, against axe's rules: none may be broken. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations, passes } = await new AxeBuilder({ page }).analyze();
  const said = violations.map(({ id, help, nodes }) => ({
    rule: id,
    help,
    where: nodes.map(({ target, failureSummary }) => `${target.join(' ')}: ${failureSummary}`),
  }));
  expect(said).toEqual([]);
  expect(passes.length).toBeGreaterThan(0);
}
