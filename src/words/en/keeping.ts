/** What can go wrong with keeping and reading on the tablet, and with questions to what is kept. */
export const keeping = {
  'store.full':
    'The tablet has no room left, so this was not kept. Free some space; what waits is kept as soon as there is room.',
  'store.refused':
    'The browser does not let Lookbell keep anything here. Leave private browsing, or allow storage for this site.',
  'store.newer':
    'A newer Lookbell has written what is kept here. Close all tabs of Lookbell and open it again to get the newer one.',
  'store.newerRow': 'A newer Lookbell has written this. Close all tabs of Lookbell and open it again.',
  'store.closed':
    'Another tab has opened a newer Lookbell, so this one keeps nothing more. Close this tab and go on in the other.',
  'store.lost':
    'The tablet’s storage does not answer. Nothing that was shown as kept is lost; try again, or open Lookbell anew.',
  'store.failed': (v: { what: string }) => `The tablet could not keep this (${v.what}). Try again.`,
  'store.busy': 'Another tab was writing the same at the same time, so this was not kept. Try again.',
  'store.changedMeanwhile':
    'This was changed in another tab or by a file in the meantime. Look at how it stands now and make the change again.',
  'store.unreadable': (v: { form: string; where: string }) =>
    `What is kept here is damaged (${v.form}${v.where === '' ? '' : `, ${v.where}`}). The rest can still be read: export the study, and bring a good copy in.`,
  'store.noSession': 'This session is not kept on this tablet.',
  'store.sessionExists': 'A session with the same identifier is kept here already, and it is another one.',
  'store.entryTaken':
    'Another recording has written under the same identity. Close the session here and resume it anew.',
  'store.wrongSession': 'These entries belong to another session.',
  'ask.stopped': 'Stopped.',
} as const;
