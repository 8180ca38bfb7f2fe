import type { KeyItem, SheetCell, SheetPart } from '../../src/charts/RoundSheet.tsx';

export const on: SheetCell = { marks: [{ kind: 'on' }] };
export const alone: SheetCell = { marks: [{ kind: 'off', nth: 1 }] };
export const others: SheetCell = { marks: [{ kind: 'off', nth: 2 }] };
export const gone: SheetCell = { marks: [{ kind: 'missing' }] };
export const other: SheetCell = { marks: [{ kind: 'other' }] };

/** `+` on-task, `a` off-task alone, `b` with others, `o` missing, `x` other; capitals and `*` (on-task) late. */
export function cells(text: string): SheetCell[] {
  const signs: Record<string, SheetCell> = { '+': on, '*': on, a: alone, b: others, o: gone, x: other };
  return [...text].map((sign) => {
    const cell = signs[sign.toLowerCase()] ?? gone;
    return sign === '*' || sign !== sign.toLowerCase() ? { ...cell, late: true } : cell;
  });
}

/** Two observers' looks side by side, one cell a look. */
export function compared(first: string, second: string): SheetCell[] {
  const [a, b] = [cells(first), cells(second)];
  return a.map((cell, k) => {
    const theirs = b[k]?.marks ?? [];
    const missing = first[k] === 'o' || second[k] === 'o';
    return { ...cell, second: theirs, differs: !missing && first[k] !== second[k] };
  });
}

export const rows = ['Otter-02', 'Otter-03', 'Otter-07', 'Otter-09', 'Otter-11', 'Otter-15'];

export const alonePart: SheetPart[] = [
  {
    name: 'before',
    cells: ['++b+a+++++', '++++++a+++', 'aab+bba+ab', '+a+++*++++', '+bao+b+++a', '++++b+aabb'].map(cells),
  },
  {
    name: 'after the break',
    cells: ['++++++++++', '+++++o++++', '+a++o+b++A', 'a+++++a+x+', '++b+a+++++', '+++++++ob+'].map(cells),
  },
];

export const comparedParts: SheetPart[] = [
  {
    name: 'before',
    cells: [
      compared('++b+a+++++', '+ab+a++a++'),
      compared('++++++a+++', '++++++a+++'),
      compared('aab+bba+ab', '+ab+bbb+ab'),
      compared('+a+++*++++', '+a+++*+++a'),
      compared('+bao+b+++a', '+bao+b+++a'),
      compared('++++b+aabb', '++++bxaabb'),
    ],
  },
  {
    name: 'after the break',
    cells: [
      compared('++++++++++', '++++++++++'),
      compared('+++++o++++', '++++++++++'),
      compared('+a++o+b++A', '++++o+b++a'),
      compared('a+++++a+++', 'a+++++a+b+'),
      compared('++b+a+++++', '++b+a+++++'),
      compared('+++++++ob+', '+++++++ob+'),
    ],
  },
];

export const legend: KeyItem[] = [
  { sign: { kind: 'on' }, label: 'on-task' },
  { sign: { kind: 'off', nth: 1 }, label: 'off-task, by oneself' },
  { sign: { kind: 'off', nth: 2 }, label: 'off-task, with others' },
  { sign: { kind: 'other' }, label: 'waiting for help' },
  { sign: { kind: 'missing' }, label: 'missing' },
  { sign: 'late', label: 'marked late' },
];
export const comparedLegend: KeyItem[] = [
  ...legend,
  { sign: 'differs', label: 'they differ (Marsh upper left, Quill lower right)' },
];
