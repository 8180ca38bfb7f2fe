/** What writes more than the recording does: loaded when it is first asked for. */
export { applyBundles } from './applyBundles.ts';
export { putEdits } from './putEdits.ts';
export { removeStudy } from './removeStudy.ts';
