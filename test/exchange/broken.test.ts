import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { mergeBundles } from '../../src/exchange/mergeBundles.ts';
import { placeOf } from '../../src/exchange/problemValues.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import { brokenSentences } from './brokenSentences.ts';
import { bytesOf, laidSession } from './sampleStudy.ts';
import { sentence } from './sentence.ts';

const folder = new URL('../broken/', import.meta.url);

/** `FILE:LINE: sentence` for each problem of a file. */
async function said(name: string, bytes: Uint8Array): Promise<string[]> {
  const outcome = await readIncoming({ name, bytes });
  return outcome.ok ? [] : outcome.problems.map((problem) => `${placeOf(problem)}: ${sentence(problem)}`);
}

test('every broken file gets one sentence: where, what was found, what was expected', async () => {
  const names = readdirSync(folder).sort();
  expect(names.length).toBeGreaterThan(70);
  const all: string[] = [];
  for (const name of names) {
    const sentences = await said(name, readFileSync(new URL(name, folder)));
    expect(sentences, name).toHaveLength(1);
    all.push(...sentences);
  }
  expect(all).toEqual(brokenSentences);
  for (const one of all) {
    expect(one).toMatch(/[:;] expected /);
    expect(one).not.toMatch(/Error:|\bat [\w.]+ \(|undefined|NaN|\[object/);
    expect(one.split('\n')).toHaveLength(1);
  }
});

const head = 'session,observer,child,interval,code';

test('a million characters in one cell, quoted or not, are one short sentence', async () => {
  const long = 'x'.repeat(1_000_000);
  const expected = ['big.csv:3: A cell has 1,000,000 characters; expected at most 10,000.'];
  const good = 's,Quill,Otter-07,1,on';
  expect(await said('big.csv', bytesOf(`${head}\n${good}\ns,Quill,${long},2,on\n`))).toEqual(expected);
  expect(await said('big.csv', bytesOf(`${head}\n${good}\ns,Quill,"${long}",2,on\n`))).toEqual(expected);
  const [json] = await said('big.json', bytesOf(`{"format": "${long}"}`));
  expect(json?.length).toBeLessThan(250);
  const [cut] = await said('big.json', bytesOf(`{"format": "${long}`));
  expect(cut).toMatch(/^big.json:1: The file ends in the middle/);
});

test('a hundred thousand brackets do not exhaust the stack', async () => {
  const [open] = await said('deep.json', bytesOf('['.repeat(100_000)));
  expect(open).toMatch(/^deep.json:1: The file ends in the middle/);
  const [closed] = await said('deep.json', bytesOf('['.repeat(100_000) + ']'.repeat(100_000)));
  expect(closed).toMatch(/nests too deep/);
});

test('every beginning of a good table or study file is refused in words or read, never thrown', async () => {
  const text = writeIntervalTable([laidSession()]);
  for (let length = 1; length < text.length; length += 7) {
    const sentences = await said('cut.csv', bytesOf(text.slice(0, length)));
    expect(sentences.length).toBeLessThanOrEqual(1);
  }
});

test('a broken file beside good ones contributes nothing', async () => {
  const good = await readIncoming({ name: 'a.csv', bytes: bytesOf(`${head}\ns,Quill,Otter-07,1,on\n`) });
  const bad = await readIncoming({
    name: 'b.csv',
    bytes: bytesOf(`${head}\ns,Quill,Otter-07,1,on\nt,Quill,Otter-07,x,on\n`),
  });
  expect(bad).not.toHaveProperty('bundle');
  expect(
    mergeBundles([good, bad].flatMap((outcome) => (outcome.ok ? [outcome.bundle] : []))).bundle.sessions,
  ).toHaveLength(1);
});
