import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import type { Readable, Writable } from 'node:stream';
import { chromiumFlags, findChromium } from '../../../tools/find-chromium.mjs';

type Message = { id?: number; result?: Record<string, unknown>; error?: { message: string } };

/**
 * One page in a browser that is driven without Playwright, which keeps every page of its own visible and in focus:
 * here a second tab in front of the page really hides it, with all that browsers do to hidden pages.
 */
export class HideablePage {
  private asked = 0;
  private readonly open = new Map<number, (message: Message) => void>();
  private session: string | undefined;
  private target = '';
  private cover: string | undefined;

  private constructor(private readonly browser: ChildProcess) {
    let text = '';
    (browser.stdio[4] as Readable).on('data', (data: Buffer) => {
      const parts = (text + data.toString()).split('\0');
      text = parts.pop() ?? '';
      for (const part of parts) {
        const message = JSON.parse(part) as Message;
        if (message.id !== undefined) this.open.get(message.id)?.(message);
      }
    });
  }

  /**
   * Starts a browser on a profile, at an empty page.
   *
   * @param before source text that every page runs before its own
   */
  static async launch(profile: string, before: readonly string[] = []): Promise<HideablePage> {
    const { path } = findChromium();
    if (path === undefined) throw new Error('no browser');
    const flags = ['--headless=new', '--remote-debugging-pipe', `--user-data-dir=${profile}`];
    const browser = spawn(path, [...flags, ...chromiumFlags, 'about:blank'], {
      stdio: ['ignore', 'ignore', 'ignore', 'pipe', 'pipe'],
    });
    const page = new HideablePage(browser);
    const { targetInfos } = (await page.send('Target.getTargets')) as {
      targetInfos: { type: string; targetId: string }[];
    };
    page.target = targetInfos.find(({ type }) => type === 'page')?.targetId ?? '';
    const attached = await page.send('Target.attachToTarget', { targetId: page.target, flatten: true });
    page.session = String(attached.sessionId);
    await page.send('Page.enable');
    await page.send('Page.setBypassCSP', { enabled: true });
    for (const source of before) await page.send('Page.addScriptToEvaluateOnNewDocument', { source });
    return page;
  }

  send(method: string, params: object = {}): Promise<Record<string, unknown>> {
    this.asked += 1;
    const id = this.asked;
    const own = this.session === undefined || /^(Target|Browser)\./.test(method);
    const message = { id, method, params, ...(own ? {} : { sessionId: this.session }) };
    return new Promise((resolve, reject) => {
      this.open.set(id, ({ result, error }) => {
        this.open.delete(id);
        if (error === undefined) resolve(result ?? {});
        else reject(new Error(`${method}: ${error.message}`));
      });
      (this.browser.stdio[3] as Writable).write(`${JSON.stringify(message)}\0`);
    });
  }

  async goto(url: string): Promise<void> {
    await this.send('Page.navigate', { url });
  }

  /** Runs a function in the page, as Playwright's `evaluate` does. */
  async evaluate<Given, Answer>(work: (given: Given) => Answer, given?: Given): Promise<Awaited<Answer>> {
    const { result, exceptionDetails } = (await this.send('Runtime.evaluate', {
      expression: `(${work})(${JSON.stringify(given) ?? ''})`,
      awaitPromise: true,
      returnByValue: true,
    })) as {
      result: { value: Awaited<Answer> };
      exceptionDetails?: { exception?: { description?: string } };
    };
    if (exceptionDetails !== undefined) throw new Error(exceptionDetails.exception?.description);
    return result.value;
  }

  /** Asks again and again until the answer is neither false nor null; the answer. */
  async until<Given, Answer>(work: (given: Given) => Answer, given?: Given, ms = 20_000) {
    const end = Date.now() + ms;
    for (;;) {
      const answer = await this.evaluate(work, given).catch(() => null);
      if (answer !== null && answer !== undefined && answer !== false) return answer;
      if (Date.now() > end) throw new Error(`never: ${work}`);
      await new Promise((next) => setTimeout(next, 50));
    }
  }

  /** Clicks the button with this label, as a person does. */
  async press(label: string): Promise<void> {
    const at = await this.until((text: string) => {
      const found = [...document.querySelectorAll('button')].find((one) => one.textContent === text);
      const box = found?.getBoundingClientRect();
      return box === undefined ? null : { x: box.x + box.width / 2, y: box.y + box.height / 2 };
    }, label);
    for (const type of ['mousePressed', 'mouseReleased'])
      await this.send('Input.dispatchMouseEvent', { type, ...at, button: 'left', clickCount: 1 });
  }

  /** Opens another tab in front of the page. */
  async hide(): Promise<void> {
    const { targetId } = await this.send('Target.createTarget', { url: 'about:blank' });
    this.cover = String(targetId);
    await this.until(() => document.visibilityState === 'hidden');
  }

  /** Closes the tab in front. */
  async show(): Promise<void> {
    await this.send('Target.activateTarget', { targetId: this.target });
    if (this.cover !== undefined) await this.send('Target.closeTarget', { targetId: this.cover });
    await this.until(() => document.visibilityState === 'visible');
  }

  async close(): Promise<void> {
    if (this.browser.exitCode !== null) return;
    const gone = once(this.browser, 'exit');
    await this.send('Browser.close').catch(() => undefined);
    await gone;
  }
}
