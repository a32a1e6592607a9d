import { z } from 'zod';
import { idSchema, momentSchema } from './common.js';

/** What may be uploaded, by content: name of the kind for people, media type and file endings. */
export const reportKinds = [
  { label: 'PDF', mediaType: 'application/pdf', endings: ['.pdf'] },
  { label: 'JPEG', mediaType: 'image/jpeg', endings: ['.jpg', '.jpeg'] },
  { label: 'PNG', mediaType: 'image/png', endings: ['.png'] },
  { label: 'plain text', mediaType: 'text/plain', endings: ['.txt'] },
] as const;
export const reportMediaTypes = reportKinds.map((kind) => kind.mediaType);
/** The largest report, in bytes: 25 MB. */
export const reportSizeLimit = 25 * 1024 * 1024;

export const reportSchema = z
  .object({
    id: idSchema,
    caseId: idSchema,
    fileName: z.string(),
    mediaType: z.string(),
    sizeBytes: z.int(),
    /** SHA-256 of the content, hexadecimal. */
    sha256: z.string(),
    uploadedBy: z.string(),
    uploadedAt: momentSchema,
    canRemove: z.boolean(),
  })
  .meta({ id: 'Report' });
export type Report = z.infer<typeof reportSchema>;
export const reportListSchema = z.object({ items: z.array(reportSchema) }).meta({ id: 'ReportList' });
export const reportParamsSchema = z.object({ reportId: idSchema });
