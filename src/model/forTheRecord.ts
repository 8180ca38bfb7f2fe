/** What a session was held for, as its header and its summary say it. */
export interface Purpose {
  readonly practice: boolean;
  readonly familiarisation?: boolean | undefined;
}

/** What results take in besides the sessions for the record. */
export interface TakenIn {
  readonly practice?: boolean | undefined;
  readonly familiarisation?: boolean | undefined;
}

/** Whether a session counts in results: practice and familiarisation visits do only where they are asked for. */
export function isForTheRecord({ practice, familiarisation }: Purpose, taken: TakenIn = {}): boolean {
  return (
    (!practice || taken.practice === true) && (familiarisation !== true || taken.familiarisation === true)
  );
}
