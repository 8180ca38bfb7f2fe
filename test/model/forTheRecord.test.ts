import { expect, it } from 'vitest';
import { isForTheRecord } from '../../src/model/forTheRecord.ts';

it('takes in practice and familiarisation visits only where each is asked for', () => {
  const [record, practice, first] = [
    { practice: false },
    { practice: true },
    { practice: false, familiarisation: true },
  ];
  const taken = (options?: Parameters<typeof isForTheRecord>[1]) =>
    [record, practice, first].map((one) => isForTheRecord(one, options));
  expect(taken()).toEqual([true, false, false]);
  expect(taken({ practice: true })).toEqual([true, true, false]);
  expect(taken({ familiarisation: true })).toEqual([true, false, true]);
  expect(taken({ practice: true, familiarisation: true })).toEqual([true, true, true]);
});
