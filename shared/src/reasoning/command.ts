import { answerTo } from './answer-text.js';

/** Reads a panel as JSON from standard input and prints the answer; exits 1 where it is refused. */
const chunks: Buffer[] = [];
for await (const chunk of process.stdin) chunks.push(chunk as Buffer);
const { answer, refused } = answerTo(Buffer.concat(chunks).toString('utf8'));
process.exitCode = refused ? 1 : 0;
process.stdout.write(`${JSON.stringify(answer)}\n`);
