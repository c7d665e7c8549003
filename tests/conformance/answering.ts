import { parentPort } from 'node:worker_threads';
import { conformanceCases, conformanceText } from './cases.ts';

// Runs in a thread or a process of its own: hands back the text of every case.
const texts = Object.values(conformanceCases).map(conformanceText);
if (parentPort === null) process.stdout.write(texts.join('\0'));
else parentPort.postMessage(texts.join('\0'));
