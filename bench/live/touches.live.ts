import type { Page } from '@playwright/test';
import { goIn, lookingAt, start } from '../../test/browser/support/observing.ts';
import { test } from '../../test/browser/support/test.ts';
import { longVisit } from './longVisit.ts';
import { sayTimes } from './rows.ts';

/** What was asked for on a processor that is four times slower (ms, at the 95th percentile). */
const answerWithin = 100;
const keptWithin = 250;

/** So many touches, so far apart (ms): no two are taken for one hand, and each is over before the next. */
const touches = 60;
const apart = 400;

interface Times {
  answer: number[];
  kept: number[];
}

/** From now on the page notes, for each touch, when its answer was painted and when "kept n of n" was. */
function watchTouches(): void {
  const times: Times = { answer: [], kept: [] };
  Object.assign(window, { touchTimes: times });
  let down: number | null = null;
  let waiting: number | null = null;
  const painted = (then: (at: number) => void): void => {
    requestAnimationFrame(() => {
      const { port1, port2 } = new MessageChannel();
      port1.onmessage = () => then(performance.now());
      port2.postMessage(null);
    });
  };
  // Found once: to look for it at each change would be a part of what is measured.
  const sign = [...document.querySelectorAll('body *')].findLast((one) =>
    /^kept \d/.test(one.textContent ?? ''),
  );
  if (sign === undefined) throw new Error('nothing says what is kept');
  const keptOf = (): readonly [number, number] => {
    const [, kept, of] = sign.textContent?.match(/kept ([\d,]+) of ([\d,]+)/) ?? [];
    return [Number(kept?.replace(',', '')), Number(of?.replace(',', ''))];
  };
  let of = keptOf()[1];
  window.addEventListener(
    'pointerdown',
    (event) => {
      down = event.timeStamp;
      waiting = event.timeStamp;
    },
    { capture: true },
  );
  new MutationObserver((changes) => {
    const felt = changes.some(({ addedNodes }) =>
      [...addedNodes].some((node) => node instanceof Element && node.classList.contains('target-felt')),
    );
    if (felt && down !== null) {
      const from = down;
      down = null;
      painted((at) => times.answer.push(at - from));
    }
    const [kept, all] = keptOf();
    if (waiting !== null && all > of && kept === all) {
      const from = waiting;
      of = all;
      waiting = null;
      painted((at) => times.kept.push(at - from));
    }
  }).observe(document.body, { subtree: true, childList: true, characterData: true });
}

async function measured(page: Page): Promise<Times> {
  // Looked up once: to search the page before each touch would slow that touch.
  const targets = await page.getByRole('button', { name: /^(on|off)-task/ }).all();
  const boxes = await Promise.all(targets.map((target) => target.boundingBox()));
  await page.evaluate(watchTouches);
  for (let i = 0; i < touches; i++) {
    const box = boxes[i % boxes.length];
    if (!box) throw new Error('no target');
    await page.touchscreen.tap(box.x + box.width / 2, box.y + box.height / 2);
    await page.waitForTimeout(apart);
  }
  return page.evaluate(() => (window as unknown as { touchTimes: Times }).touchTimes);
}

test.describe('A touch, until its answer is seen and until it is kept', () => {
  for (const { rate, label } of [
    { rate: 1, label: '' },
    { rate: 4, label: ', processor 4 times slower' },
  ])
    test(`rate ${rate}`, async ({ tablet }) => {
      const page = await tablet.visitOnce();
      await goIn(page, await longVisit(`touches ${rate}`));
      await start(page);
      await lookingAt(page, 'Otter-01');
      const cdp = await tablet.context.newCDPSession(page);
      await cdp.send('Emulation.setCPUThrottlingRate', { rate });
      const { answer, kept } = await measured(page);
      sayTimes(`answer${label}`, answer, rate > 1 ? answerWithin : undefined);
      sayTimes(`kept${label}`, kept, rate > 1 ? keptWithin : undefined);
    });
});
