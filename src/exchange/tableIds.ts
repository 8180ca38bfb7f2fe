import { byCodePoint } from '../kernel/compare.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import type { Id } from '../kernel/ids.ts';
import type { TableRow } from './readTableRow.ts';
import type { ReadOptions } from './types.ts';

/** An identifier that Lookbell wrote into a table stays what it is. */
const ownId = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

const idOf = (text: string, ...content: readonly string[]): Id =>
  ownId.test(text) ? text : idFromContent(...content, text);

/** The identifiers that a table's rows stand for: the same content gives the same ones, wherever it is read. */
export interface TableIds {
  study(row: TableRow): Id;
  classroom(row: TableRow): Id;
  observer(row: TableRow): Id;
  child(row: TableRow, pseudonym: string): Id;
  session(first: TableRow, rows: readonly TableRow[]): Id;
  /** By the `visit` column; without it each session is a visit of its own until the analysis pairs it. */
  visit(first: TableRow, session: Id): Id;
}

/** Recognises the study's classes, children and observers by name, and makes identifiers for the others. */
export function tableIds({ study: known }: ReadOptions): TableIds {
  const classes = new Map(known?.classes?.filter((one) => !one.removed).map((one) => [one.name, one]));
  const observers = new Map(known?.observers?.filter((one) => !one.removed).map((one) => [one.name, one.id]));
  const children = new Map(
    [...classes.values()].flatMap((one) =>
      one.children
        .filter((child) => !child.removed)
        .map((child) => [`${one.id} ${child.pseudonym}`, child.id]),
    ),
  );
  const study = (row: TableRow): Id => known?.id ?? idOf(row.study ?? '', 'study');
  const classroom = (row: TableRow): Id =>
    classes.get(row.class ?? '')?.id ?? idFromContent('class', study(row), row.class ?? '');
  return {
    study,
    classroom,
    observer: (row) => observers.get(row.observer) ?? idFromContent('observer', study(row), row.observer),
    child: (row, pseudonym) => {
      const room = classroom(row);
      return children.get(`${room} ${pseudonym}`) ?? idFromContent('child', room, pseudonym);
    },
    session: (first, rows) => {
      const phases = [...new Set(rows.map(({ phase }) => phase ?? ''))].sort(byCodePoint);
      const { observer, class: room, condition, visit, date, start, method } = first;
      const facts = [observer, room, condition, visit, date, start, method].map((fact) => fact ?? '');
      return idOf(first.session, 'session', study(first), ...facts, ...phases);
    },
    visit: (first, session) =>
      first.visit === null
        ? idFromContent('visit of session', session)
        : idOf(first.visit, 'visit', study(first)),
  };
}
