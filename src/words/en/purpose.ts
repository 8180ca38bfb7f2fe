/** What a session is held for: said once, before the classroom door. */
export const purpose = {
  purpose: 'What is this session for?',
  purposeRecord: 'it counts',
  purposeRecordHint: 'Its figures go into the results.',
  purposePractice: 'practice',
  purposeFamiliarisation: 'familiarisation visit',
  purposeFamiliarisationHint:
    'The class gets used to being observed. Kept and marked as such; left out of results unless asked for.',
} as const;
