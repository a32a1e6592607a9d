import { randomUUID } from 'node:crypto';
import type { Readable } from 'node:stream';
import type { RunningApp } from '../setup/app.js';
import type { Agent } from './people.js';

/** One answer as it came over the network. Of a PDF, whose bytes are packed, the text says only that it is one. */
export interface Answered {
  route: string;
  status: number;
  text: string;
}

interface OpenApi {
  paths: Record<string, { get?: { parameters?: { name: string; in: string; required?: boolean }[] } }>;
}

/** Query texts that open more than a route shows by itself. */
const variants: Record<string, string[]> = {
  '/api/cases': ['?size=100', '?size=100&q=fever', '?size=100&state=judging&sort=-updatedAt'],
  '/api/cases/{caseId}/export': ['pdf', 'letter', 'fhir', 'panel'].map((format) => `?format=${format}`),
  '/api/cases/{caseId}/trail': ['?size=200'],
};

/**
 * Asks every GET route of the application once (and with the queries above), with these ids in the paths and an
 * unknown id for every other parameter.
 * @param skip paths that are not asked
 */
export async function everyGet(
  running: RunningApp,
  agent: Agent,
  ids: Record<string, string>,
  skip = /^$/,
): Promise<Answered[]> {
  const { paths } = (await running.agent().get('/api/openapi.json').expect(200)).body as OpenApi;
  const answers: Answered[] = [];
  for (const [path, { get }] of Object.entries(paths)) {
    if (!get || skip.test(path)) continue;
    const filled = path.replace(/\{(\w+)\}/g, (_, name: string) => ids[name] ?? randomUUID());
    for (const query of variants[path] ?? ['']) {
      const answer = await agent
        .get(filled + query)
        .buffer(true)
        .parse(asText);
      const text = String(answer.body);
      answers.push({
        route: path + query,
        status: answer.status,
        text: text.startsWith('%PDF') ? '%PDF' : text,
      });
    }
  }
  return answers;
}

/** Whatever the kind of content, one character for each byte. */
function asText(response: unknown, done: (error: Error | null, text: string) => void): void {
  const stream = response as Readable;
  let text = '';
  stream.setEncoding('latin1');
  stream.on('data', (part: string) => (text += part));
  stream.on('end', () => {
    done(null, text);
  });
}
