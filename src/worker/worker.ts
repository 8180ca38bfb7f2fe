import type { Endpoint } from 'comlink';
import { openStore } from '../storage/index.ts';
import { serveQuestions } from './serve.ts';

// The worker reads the tablet's store by itself: questions come in, figures go out.
serveQuestions(() => openStore(), globalThis as unknown as Endpoint);
