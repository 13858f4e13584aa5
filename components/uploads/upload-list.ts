import { z } from 'zod';

/** One file of a study's uploads, as the page shows it. */
export const shownUploadSchema = z.object({
  id: z.string(),
  fileName: z.string(),
  bytes: z.number(),
  kind: z.string().nullable(),
  state: z.enum(['queued', 'reading', 'read', 'failed', 'refused']),
  known: z.boolean(),
  problem: z.object({ code: z.string(), message: z.string(), line: z.number().nullish() }).nullable(),
  bytesRead: z.number(),
  runId: z.string().nullable(),
});
export type ShownUpload = z.infer<typeof shownUploadSchema>;

/** What the progress stream sends: the newest uploads and how many there are in each state. */
export const uploadListSchema = z.object({
  uploads: z.array(shownUploadSchema),
  counts: z.record(z.string(), z.number()),
});
export type UploadList = z.infer<typeof uploadListSchema>;
