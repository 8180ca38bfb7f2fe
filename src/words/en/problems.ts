/** What JSON should have held, by the words of the schemas. */
function expectedJson(expected: string, detail: string): string {
  const words: Record<string, string> = {
    string: 'a text',
    number: 'a number',
    integer: 'a whole number',
    boolean: 'true or false',
    array: 'a list',
    object: 'an object with members',
    record: 'an object with members',
    null: 'null',
    oneOf: `one of: ${detail}`,
    least: `a number of at least ${detail}`,
    most: `a number of at most ${detail}`,
    longer: `at least ${detail} ${detail === '1' ? 'character or item' : 'characters or items'}`,
    shorter: `at most ${detail} characters or items`,
    date: 'a date such as 2026-11-03',
    wall: 'a date and time with offset such as 2026-11-03T10:42:07+01:00',
    form: `a text of the form ${detail}`,
  };
  return words[expected] ?? 'what the description of the file form asks for';
}

const nouns: Record<string, string> = {
  study: 'study',
  class: 'class',
  observer: 'observer',
  protocol: 'protocol version',
  visit: 'planned visit',
};

interface Numbers {
  whole(n: number): string;
  plural(n: number, forms: { one: string; other: string }): string;
}

/** What can be wrong with a file, or worth knowing about it: what was found, and what was expected. */
export const problems = {
  'file.empty': 'The file is empty; expected a study file, a visit file or an interval table.',
  'file.notUtf8': 'The text is not UTF-8 here; expected a file saved as UTF-8.',
  'file.utf16': 'The file is saved as UTF-16; expected UTF-8.',
  'file.html': 'This is a web page; expected a study file, a visit file or an interval table.',
  'file.zip':
    'This is a zip archive or a spreadsheet workbook; expected a study file, a visit file or an interval table saved as CSV.',
  'file.cutOffCompressed':
    'The compressed file is damaged or cut off; expected a whole one: hand it over again.',
  'file.tooLarge': (v: { most: number }) =>
    `The compressed file is too large when unpacked; expected at most ${v.most} megabytes.`,
  'file.nul': 'There is a NUL character here; expected plain text.',
  'json.cutOff': 'The file ends in the middle; expected the rest of its JSON: hand it over again.',
  'json.notJson': (v: { found: string }) => `This is not JSON from “${v.found}” on; expected valid JSON.`,
  'json.tooDeep': (v: { path: string; most: number }) =>
    `${v.path} nests too deep; expected at most ${v.most} levels.`,
  'json.nul': (v: { path: string }) => `${v.path} holds a NUL character; expected plain text.`,
  'json.otherForm': (v: { found: string }) =>
    `This is not a file of Lookbell: its format is ${v.found}; expected "lookbell-study" or "lookbell-visit".`,
  'json.newer': (v: { version: number; known: number }) =>
    `The file is of version ${v.version}, made by a newer Lookbell; expected version ${v.known} or older: update Lookbell and read it again.`,
  'json.absent': (v: { path: string; expected: string; detail: string }) =>
    `${v.path} is absent; expected ${expectedJson(v.expected, v.detail)}.`,
  'json.wrong': (v: { path: string; expected: string; detail: string; found: string }) =>
    `${v.path} is ${v.found}; expected ${expectedJson(v.expected, v.detail)}.`,
  'study.checksum': (v: { classes: number; sessions: number; entries: number }, f: Numbers) =>
    `The checksum does not match: the file was changed or damaged after it was written. What can still be read: ${v.classes} ${f.plural(v.classes, { one: 'class', other: 'classes' })}, ${v.sessions} ${f.plural(v.sessions, { one: 'session', other: 'sessions' })} with ${f.whole(v.entries)} ${f.plural(v.entries, { one: 'entry', other: 'entries' })}.`,
  'study.twice': (v: { path: string; id: string }) =>
    `${v.path} has the identifier ${v.id} of one before it; expected each only once.`,
  'study.otherSession': (v: { path: string; found: string; expected: string }) =>
    `${v.path} is ${v.found}; expected ${v.expected}, the session in whose journal it stands.`,
  'study.otherStudy': (v: { path: string; found: string; expected: string }) =>
    `${v.path} is ${v.found}; expected ${v.expected}, the study of this file.`,
  'study.noInterval': (v: { path: string; interval: number; most: number }) =>
    `${v.path} is ${v.interval}; expected an interval of the session, whose last one is ${v.most}.`,
  'study.noCode': (v: { path: string; code: string; codes: string }) =>
    `${v.path} is the unknown code ${v.code}; expected one of the session's codes: ${v.codes}.`,
  'study.gap': (v: { path: string; n: number; first: number }, f: Numbers) =>
    `${v.path}: ${v.n} ${f.plural(v.n, { one: 'entry of a writer is', other: 'entries of a writer are' })} absent, the first with number ${v.first}; what is there is read.`,
  'study.entryConflict': (v: { path: string; seq: number }) =>
    `${v.path}: entry number ${v.seq} of its writer stands here with two contents; both are kept, to be looked at.`,
  'study.newKinds': (v: { kinds: string; n: number }, f: Numbers) =>
    `${v.n} ${f.plural(v.n, { one: 'entry is', other: 'entries are' })} of a kind that only a newer Lookbell knows (${v.kinds}); they are kept and passed on.`,
  'visit.checksum': (v: { children: number }, f: Numbers) =>
    `The checksum does not match: the file was changed or damaged after it was written. What can still be read: one visit with ${v.children} ${f.plural(v.children, { one: 'child', other: 'children' })}.`,
  'table.noRows': 'There are no rows below the column names; expected at least one interval.',
  'table.columns': (v: { absent: string; found: string }) =>
    `The column names lack ${v.absent}; expected session, observer, child, interval and code, found “${v.found}”.`,
  'table.columnTwice': (v: { column: string }) =>
    `The column ${v.column} is there twice; expected each column once.`,
  'table.columnsDropped': (v: { columns: string; n: number }, f: Numbers) =>
    `${f.plural(v.n, { one: 'Unknown column, not taken over', other: 'Unknown columns, not taken over' })}: ${v.columns}.`,
  'table.ragged': (v: { cells: number; columns: number }, f: Numbers) =>
    `The row has ${v.cells} ${f.plural(v.cells, { one: 'cell', other: 'cells' })}; expected ${v.columns}, as many as there are column names.`,
  'table.quoteOpen': 'A quoted cell begins here and is never closed; expected a closing quotation mark.',
  'table.quoteAfter': (v: { found: string }) =>
    `After a quoted cell stands “${v.found}”; expected a delimiter or the end of the row.`,
  'table.cellTooLong': (v: { length: number; most: number }, f: Numbers) =>
    `A cell has ${f.whole(v.length)} characters; expected at most ${f.whole(v.most)}.`,
  'table.textTooLong': (v: { column: string; length: number; most: number }) =>
    `${v.column} has ${v.length} characters; expected at most ${v.most}.`,
  'table.needed': (v: { column: string }) => `${v.column} is empty; expected a text in every row.`,
  'table.noChild': 'child is empty; expected a pseudonym (only headcount rows go without).',
  'table.interval': (v: { found: string }) => `interval is “${v.found}”; expected a positive whole number.`,
  'table.number': (v: { column: string; found: string }) => `${v.column} is “${v.found}”; expected a number.`,
  'table.whole': (v: { column: string; found: string }) =>
    `${v.column} is “${v.found}”; expected a whole number, 0 or more.`,
  'table.positive': (v: { column: string; found: string }) =>
    `${v.column} is “${v.found}”; expected a number above 0.`,
  'table.notNegative': (v: { column: string; found: string }) =>
    `${v.column} is “${v.found}”; expected 0 or more.`,
  'table.date': (v: { column: string; found: string }) =>
    `${v.column} is “${v.found}”; expected a date such as 2026-11-03.`,
  'table.start': (v: { found: string }) =>
    `start is “${v.found}”; expected a date and time with offset such as 2026-11-03T10:42+01:00.`,
  'table.word': (v: { column: string; found: string; expected: string }) =>
    `${v.column} is “${v.found}”; expected one of: ${v.expected}.`,
  'table.codeAndMissing': (v: { code: string; missing: string }) =>
    `The row has both the code or count “${v.code}” and the reason “${v.missing}”; expected only one of the two.`,
  'table.noCode': 'code is empty and no reason is given; expected a code, or a reason in the column missing.',
  'table.severalCodes': (v: { code: string }) =>
    `code is “${v.code}”; expected one code (several only with the methods partial, whole or duration).`,
  'table.headcountCode': (v: { code: string }) =>
    `code is “${v.code}” in a headcount row; expected it empty, with on_count and present_count filled in.`,
  'table.counts':
    'A headcount row lacks on_count or present_count; expected both, or a reason in the column missing.',
  'table.countsOver': (v: { on: number; present: number }) =>
    `on_count is ${v.on} of present_count ${v.present}; expected no more children on-task than present.`,
  'table.countsElsewhere': (v: { method: string }) =>
    `The row has a count but its method is ${v.method}; expected the method headcount.`,
  'table.observeOver': (v: { observe: number; interval: number }) =>
    `observe_s is ${v.observe} and interval_s ${v.interval}; expected observe_s no longer than interval_s.`,
  'table.durationTimes': 'A duration row lacks start_s or end_s; expected both.',
  'table.endBeforeStart': (v: { start: number; end: number }) =>
    `end_s is ${v.end} and start_s ${v.start}; expected the end no earlier than the start.`,
  'table.twice': (v: { session: string; child: string; interval: number; firstLine: number }) =>
    `Session ${v.session}${v.child === '' ? '' : `, child ${v.child}`}, interval ${v.interval} is already in line ${v.firstLine}; expected each interval once.`,
  'table.twoObservers': (v: { session: string; first: string; found: string }) =>
    `Session ${v.session} has the observers ${v.first} and ${v.found}; expected one observer a session.`,
  'table.varies': (v: { column: string; session: string; first: string; found: string }) =>
    `${v.column} is “${v.found}”, and “${v.first}” in the first row of session ${v.session}; expected the same in all its rows.`,
  'table.roleUnknown': (v: { labels: string; n: number }, f: Numbers) =>
    `The ${f.plural(v.n, { one: 'code', other: 'codes' })} ${v.labels} may be on-task or off-task; expected labels that begin with “on-task” or “off-task”, or to be told which is which.`,
  'classList.noRows': (v: { line: number }) =>
    `Line ${v.line}: no child is listed; expected at least one line with a pseudonym.`,
  'classList.columns': (v: { absent: string; found: string; line: number }) =>
    `Line ${v.line}: the column names lack ${v.absent}; expected child and consent (stratum and seat if wanted), found “${v.found}”.`,
  'classList.noChild': (v: { line: number }) => `Line ${v.line}: child is empty; expected a pseudonym.`,
  'classList.consent': (v: { found: string; line: number }) =>
    `Line ${v.line}: consent is “${v.found}”; expected yes or no.`,
  'classList.twice': (v: { pseudonym: string; firstLine: number; line: number }) =>
    `Line ${v.line}: ${v.pseudonym} is already in line ${v.firstLine}; expected each child once.`,
  'classList.cells': (v: { cells: number; columns: number; line: number }, f: Numbers) =>
    `Line ${v.line}: ${v.cells} ${f.plural(v.cells, { one: 'cell', other: 'cells' })}; expected ${v.columns}, as in the first line.`,
  'classList.text': (v: { column: string; most: number; line: number }) =>
    `Line ${v.line}: ${v.column} is too long or damaged; expected at most ${v.most} plain characters.`,
  'classList.broken': (v: { line: number }) =>
    `Line ${v.line}: the cells cannot be told apart; expected quotation marks that are closed and cells of at most 10,000 characters.`,
  'merge.session': (v: { session: string; observer: string; n: number }) =>
    `Session ${v.session} of ${v.observer} stands in ${v.n} different forms in these files; one of them is taken, and all can be looked at.`,
  'merge.entry': (v: { session: string; writer: string; seq: number }) =>
    `Session ${v.session}: entry number ${v.seq} of one writer stands with two contents; both are kept, to be looked at.`,
  'merge.record': (v: { noun: string; name: string }) =>
    `The ${nouns[v.noun] ?? v.noun} ${v.name} stands with two contents of the same age; one of them is taken, and both can be looked at.`,
  'merge.studies': (v: { kept: string; other: string }) =>
    `The files belong to different studies: ${v.kept} and ${v.other}; expected files of one study.`,
} as const;
