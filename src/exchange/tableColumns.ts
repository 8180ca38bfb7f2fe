/** The columns of an interval table, in the order in which they are written. Reading takes them in any order. */
export const tableColumns = [
  'session',
  'observer',
  'child',
  'interval',
  'code',
  'missing',
  'role',
  'class',
  'condition',
  'phase',
  'visit',
  'date',
  'start',
  'study',
  'round',
  'start_s',
  'end_s',
  'method',
  'interval_s',
  'observe_s',
  'lesson_part',
  'minutes_from_break',
  'on_count',
  'present_count',
] as const;
export type TableColumn = (typeof tableColumns)[number];

export const neededColumns: readonly TableColumn[] = ['session', 'observer', 'child', 'interval', 'code'];

/** What every row of one session has to say alike, beside the observer. */
export const sessionColumns = [
  'role',
  'class',
  'condition',
  'visit',
  'date',
  'start',
  'study',
  'method',
  'interval_s',
  'observe_s',
] as const satisfies readonly TableColumn[];
