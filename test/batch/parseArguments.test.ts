import { describe, expect, test } from 'vitest';
import { parseArguments } from '../../src/batch/parseArguments.ts';
import { say } from '../../src/words/say.ts';
import { wordsFor } from '../../src/words/words.ts';

describe('parseArguments', () => {
  test('command, files and options in any order', () => {
    expect(
      parseArguments([
        'change',
        '--json',
        'a.csv',
        '--before=pre',
        '--after',
        'post',
        'b',
        '--control',
        'no break',
      ]),
    ).toMatchObject({
      ok: true,
      value: {
        command: 'change',
        files: ['a.csv', 'b'],
        json: true,
        before: 'pre',
        after: 'post',
        control: 'no break',
      },
    });
  });

  test('lists of labels, given once or several times', () => {
    expect(
      parseArguments(['ontask', 'a', '--on', 'busy, helping', '--on', 'reading', '--off=idle']),
    ).toMatchObject({
      value: { on: ['busy', 'helping', 'reading'], off: ['idle'], practice: false },
    });
  });

  test('help goes before everything; after -- all are files', () => {
    expect(parseArguments(['frobnicate', '--help'])).toEqual({ ok: true, value: 'help' });
    expect(parseArguments(['check', '--', '--odd.csv'])).toMatchObject({ value: { files: ['--odd.csv'] } });
  });

  test.each([
    [[], 'noCommand'],
    [['frobnicate', 'x.csv'], 'unknownCommand'],
    [['package', 'x.csv'], 'notYet'],
    [['ontask'], 'noFiles'],
    [['ontask', 'x.csv', '--jsno'], 'unknownOption'],
    [['ontask', 'x.csv', '--json=yes'], 'optionTakesNone'],
    [['change', 'x.csv', '--before'], 'optionNeedsValue'],
    [['change', 'x.csv', '--before', '--after', 'x'], 'optionNeedsValue'],
    [['change', 'x.csv', '--before', 'a', '--before', 'b'], 'optionTwice'],
    [['ontask', 'x.csv', '--before', 'pre'], 'optionElsewhere'],
    [['ontask', 'x.csv', '--on', 'busy', '--off', 'Busy'], 'labelTwice'],
  ])('wrong usage %j', (words, code) => {
    const parsed = parseArguments(words);
    if (parsed.ok) throw new Error('was taken');
    expect(parsed.problem.code).toBe(code);
    expect(say(wordsFor().batch, parsed.problem)).toMatch(/^[A-Z\-T].*\.$/);
  });
});
