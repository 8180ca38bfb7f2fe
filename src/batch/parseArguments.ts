import { type Problem, problem, type Result } from '../kernel/result.ts';

export const commands = ['ontask', 'agreement', 'change', 'check'] as const;
export type Command = (typeof commands)[number];

/** What somebody asked for on the command line. */
export interface Request {
  readonly command: Command;
  readonly files: readonly string[];
  readonly json: boolean;
  readonly practice: boolean;
  readonly familiarisation: boolean;
  readonly on: readonly string[];
  readonly off: readonly string[];
  readonly before?: string | undefined;
  readonly after?: string | undefined;
  readonly control?: string | undefined;
  readonly observer?: string | undefined;
}

const flags = ['--json', '--practice', '--with-familiarisation'];
const lists = ['--on', '--off'];
const ofChange = ['--before', '--after', '--control', '--observer'];

/** Reads the words after `--`. `help` = the text of the command was asked for. A problem is wrong usage. */
export function parseArguments(words: readonly string[]): Result<Request | 'help', Problem> {
  const given = new Map<string, string[]>();
  const plain: string[] = [];
  for (let i = 0; i < words.length; i++) {
    const word = words[i] as string;
    if (word === '--') {
      plain.push(...words.slice(i + 1));
      break;
    }
    if (word === '--help' || word === '-h') return { ok: true, value: 'help' };
    if (!word.startsWith('-') || word === '-') {
      plain.push(word);
      continue;
    }
    const equals = word.indexOf('=');
    const option = equals < 0 ? word : word.slice(0, equals);
    const inline = equals < 0 ? null : word.slice(equals + 1);
    if (![...flags, ...lists, ...ofChange].includes(option)) return problem('unknownOption', { option });
    if (given.has(option) && !lists.includes(option)) return problem('optionTwice', { option });
    if (flags.includes(option)) {
      if (inline !== null) return problem('optionTakesNone', { option });
      given.set(option, []);
      continue;
    }
    const value = inline ?? words[++i];
    if (value === undefined || value === '' || (inline === null && value.startsWith('--')))
      return problem('optionNeedsValue', { option });
    given.set(option, [...(given.get(option) ?? []), value]);
  }
  return requestOf(plain, given);
}

function requestOf(plain: readonly string[], given: ReadonlyMap<string, string[]>): Result<Request, Problem> {
  const [command, ...files] = plain;
  if (command === undefined) return problem('noCommand');
  if (command === 'package') return problem('notYet');
  if (!isCommand(command)) return problem('unknownCommand', { command });
  const elsewhere = command === 'change' ? undefined : ofChange.find((option) => given.has(option));
  if (elsewhere !== undefined) return problem('optionElsewhere', { option: elsewhere, command });
  if (files.length === 0) return problem('noFiles');
  const listed = (option: string): string[] =>
    (given.get(option) ?? []).flatMap((value) =>
      value
        .split(',')
        .map((label) => label.trim())
        .filter((label) => label !== ''),
    );
  const [on, off] = [listed('--on'), listed('--off')];
  const label = on.find((one) => off.some((other) => other.toLowerCase() === one.toLowerCase()));
  if (label !== undefined) return problem('labelTwice', { label });
  const single = (option: string): string | undefined => given.get(option)?.[0];
  return {
    ok: true,
    value: {
      command,
      files,
      json: given.has('--json'),
      practice: given.has('--practice'),
      familiarisation: given.has('--with-familiarisation'),
      on,
      off,
      before: single('--before'),
      after: single('--after'),
      control: single('--control'),
      observer: single('--observer'),
    },
  };
}

function isCommand(word: string): word is Command {
  return (commands as readonly string[]).includes(word);
}
