import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import type { ShownUpload, UploadList } from './upload-list';

/** A file on its way to the server. */
export interface SendingFile {
  key: string;
  path: string;
  bytes: number;
  sent: number;
  problem: string | null;
}

export function UploadTable({
  studyId,
  sending,
  list,
  onRetry,
}: {
  studyId: string;
  sending: readonly SendingFile[];
  list: UploadList;
  onRetry: ((uploadId: string) => void) | null;
}) {
  const { counts } = list;
  const open = (counts.queued ?? 0) + (counts.reading ?? 0);
  return (
    <>
      <p aria-live="polite" className="mt-4 mb-2 text-small text-ink-2">
        {sending.length > 0 ? `${sending.filter(({ problem }) => !problem).length} being sent · ` : ''}
        {open > 0 ? `${open} waiting or being read · ` : ''}
        {counts.read ?? 0} read · {counts.failed ?? 0} failed · {counts.refused ?? 0} refused
      </p>
      {sending.length + list.uploads.length === 0 ? null : (
        <DataTable caption="Uploaded files, newest first">
          <thead>
            <tr>
              <th scope="col">File</th>
              <th scope="col" className="num">
                Size
              </th>
              <th scope="col">State</th>
            </tr>
          </thead>
          <tbody>
            {sending.map((file) => (
              <tr key={file.key}>
                <td className="break-all">{file.path}</td>
                <td className="num">{size(file.bytes)}</td>
                <td className={file.problem ? 'text-dissent' : ''}>
                  {file.problem ?? `sending, ${percent(file.sent, file.bytes)}`}
                </td>
              </tr>
            ))}
            {list.uploads.map((upload) => (
              <UploadRow key={upload.id} studyId={studyId} upload={upload} onRetry={onRetry} />
            ))}
          </tbody>
        </DataTable>
      )}
    </>
  );
}

function UploadRow({
  studyId,
  upload,
  onRetry,
}: {
  studyId: string;
  upload: ShownUpload;
  onRetry: ((uploadId: string) => void) | null;
}) {
  const bad = upload.state === 'failed' || upload.state === 'refused';
  return (
    <tr data-state={upload.state}>
      <td className="break-all">
        {upload.runId && upload.state === 'read' ? (
          <a href={`/studies/${studyId}/runs/${upload.runId}`}>{upload.fileName}</a>
        ) : (
          upload.fileName
        )}
      </td>
      <td className="num">{upload.bytes > 0 ? size(upload.bytes) : '–'}</td>
      <td>
        <span className={bad ? 'font-semibold text-dissent' : ''}>{stateWords(upload)}</span>
        {upload.known ? (
          <span className="text-ink-3"> · these bytes were known already, stored once</span>
        ) : null}
        {upload.problem ? (
          <span className="block max-w-[70ch] text-small text-ink-2">
            {upload.problem.line ? `Line ${upload.problem.line}: ` : ''}
            {upload.problem.message}
          </span>
        ) : null}
        {upload.state === 'failed' && onRetry ? (
          <Button size="small" onClick={() => onRetry(upload.id)}>
            Read again
          </Button>
        ) : null}
      </td>
    </tr>
  );
}

function stateWords(upload: ShownUpload): string {
  if (upload.state === 'reading') return `reading, ${percent(upload.bytesRead, upload.bytes)}`;
  if (upload.state === 'read' && upload.problem) return `read · ${upload.problem.code}`;
  return upload.state;
}

function percent(part: number, whole: number): string {
  return `${whole === 0 ? 100 : Math.floor((100 * part) / whole)} %`;
}

function size(bytes: number): string {
  if (bytes < 1024) return `${bytes} B`;
  if (bytes < 1024 ** 2) return `${(bytes / 1024).toFixed(0)} kB`;
  return `${(bytes / 1024 ** 2).toFixed(1)} MB`;
}
