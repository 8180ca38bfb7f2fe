import { ok, problem, type Result } from '../kernel/result.ts';

/** The demo study's files, which the build brings along beside the program. */
export async function demoFiles(): Promise<Result<{ name: string; bytes: Uint8Array }[]>> {
  try {
    const index: unknown = await (await fetch('./demo-sessions/index.json')).json();
    const names = (index as { files: string[] }).files.filter((name) => /\.(json|csv)$/.test(name));
    const files = await Promise.all(
      names.map(async (name) => {
        const answer = await fetch(`./demo-sessions/${name}`);
        if (!answer.ok) throw new Error(name);
        return { name, bytes: new Uint8Array(await answer.arrayBuffer()) };
      }),
    );
    return ok(files);
  } catch {
    return problem('demo.notThere');
  }
}
