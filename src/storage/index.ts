export { memoryStore } from './memoryStore.ts';
export { databaseName, openStore } from './openStore.ts';
export type { Seal } from './seal.ts';
export { sessionStoreOf } from './sessionStore.ts';
