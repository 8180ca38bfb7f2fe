/** Why a session cannot be begun, taken up or kept. */
export const recording = {
  'recorder.noSound': 'The sound does not start. Touch Start again; without sound the cue is shown.',
  'recorder.ended': 'This session has ended already.',
  'recorder.otherTabRecords': 'Another window of this tablet records. Go on there, or close it first.',
  'recorder.goneOn': 'Another window has recorded on meanwhile. Take the session up again.',
  'recorder.storeFailed': 'The tablet did not keep this. It is asked again.',
  'recorder.storeSlow': 'The tablet takes long to keep this. It is asked again.',
  'recorder.startTooNear': ({ seconds }: { seconds: number }) =>
    `The agreed second is too near: agree on one at least ${seconds} seconds from now.`,
  'session.running': 'A session is running on this tablet. End it first.',
  'session.notThere': 'This session is not kept on this tablet.',
  'session.ended': 'This session has ended already.',
  'demo.notThere': 'The demo study cannot be read. Open Lookbell once with network, then try again.',
} as const;
