import type { Report } from '@weighhouse/shared/contracts/reports';
import type { Agent } from './people.js';

/** Small files whose content is what they say. */
export const files = {
  pdf: Buffer.from(
    '%PDF-1.7\n%\u00e2\u00e3\u00cf\u00d3\n1 0 obj\n<< >>\nendobj\ntrailer << >>\n%%EOF\n',
    'latin1',
  ),
  png: Buffer.from(
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
    'base64',
  ),
  jpeg: Buffer.from(
    'ffd8ffe000104a46494600010100000100010000ffdb004300080606070605080707070909080a0c140d0c0b0b0c1912130f14ffd9',
    'hex',
  ),
  text: Buffer.from('Ultrasound: spleen 14 cm, no ascites.\n', 'utf8'),
} as const;

/** Uploads a file as a browser does. */
export async function uploadReport(
  agent: Agent,
  caseId: string,
  file: { content?: Buffer; name?: string; type?: string } = {},
): Promise<Report> {
  const { content = files.pdf, name = 'ultrasound.pdf', type = 'application/pdf' } = file;
  const answer = await agent
    .post(`/api/cases/${caseId}/reports`)
    .attach('file', content, { filename: name, contentType: type })
    .expect(201);
  return answer.body as Report;
}
