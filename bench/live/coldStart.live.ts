import { test } from '../../test/browser/support/test.ts';
import { sayTimes } from './rows.ts';

const starts = 5;

/** Notes when the first text was painted and when the room's door said how things stand. */
const watchDoor = () => {
  const look = (): void => {
    if (document.querySelector('main h1')?.textContent === 'Nothing is being recorded.')
      Object.assign(window, { doorAt: performance.now() });
    else requestAnimationFrame(look);
  };
  look();
};

test.describe('Cold start without network', () => {
  test('to the door of the room', async ({ tablet }) => {
    await tablet.visitOnce();
    await tablet.site.stop();
    const [paints, doors]: [number[], number[]] = [[], []];
    for (let i = 0; i < starts; i++) {
      await tablet.close();
      const context = await tablet.launch();
      await context.setOffline(true);
      await context.addInitScript(watchDoor);
      const page = await tablet.openApp({ hash: '/room' });
      await page.waitForFunction(() => 'doorAt' in window);
      const { paint, door } = await page.evaluate(() => ({
        paint: performance.getEntriesByName('first-contentful-paint')[0]?.startTime ?? Number.NaN,
        door: (window as unknown as { doorAt: number }).doorAt,
      }));
      paints.push(paint);
      doors.push(door);
    }
    sayTimes('first thing painted', paints);
    sayTimes('door of the room can be used', doors);
  });
});
