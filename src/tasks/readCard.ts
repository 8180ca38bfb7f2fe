/**
 * What the second tablet needs to read a pairing card. Not part of `index.ts`: it is loaded when it is wanted.
 */
export { addParts, type CardParts, missingParts } from '../exchange/cardParts.ts';
export { cardProblem } from '../exchange/cardProblems.ts';
export { readPairingCard } from '../exchange/pairingCard.ts';
export { readQr } from '../exchange/readQr.ts';
export { adoptVisit } from './visitFiles.ts';
