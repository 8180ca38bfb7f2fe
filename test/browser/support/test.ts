import { test as base, expect } from '@playwright/test';
import { Site } from './site.ts';
import { Tablet, type TabletOptions } from './tablet.ts';

interface Fixtures {
  /** The folder under which the app is served: `test.use({ base: '/some/folder/' })`. */
  base: string;
  tabletOptions: TabletOptions;
  site: Site;
  /** A tablet with a fresh profile, its browser started. */
  tablet: Tablet;
  /** Makes further tablets, for tests with two observers. Their browsers are started. */
  anotherTablet: (options?: TabletOptions) => Promise<Tablet>;
}

/**
 * Every tablet of a test is asked at the end whether it spoke to anybody but the site and whether an error went
 * uncaught: a test that expects one or the other empties the list itself.
 */
export const test = base.extend<Fixtures>({
  base: ['/', { option: true }],
  tabletOptions: [{}, { option: true }],
  site: async ({ base: folder }, use) => {
    const site = new Site(folder);
    await site.start();
    await use(site);
    await site.remove();
  },
  anotherTablet: async ({ site }, use) => {
    const tablets: Tablet[] = [];
    await use(async (options) => {
      const tablet = new Tablet(site, options);
      tablets.push(tablet);
      await tablet.launch();
      return tablet;
    });
    for (const tablet of tablets) await tablet.remove();
    expect(tablets.flatMap(({ foreignRequests }) => foreignRequests)).toEqual([]);
    expect(tablets.flatMap(({ pageErrors }) => pageErrors)).toEqual([]);
  },
  tablet: async ({ anotherTablet, tabletOptions }, use) => {
    await use(await anotherTablet(tabletOptions));
  },
});

export { expect };
