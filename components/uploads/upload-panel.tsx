'use client';
import { QueryClient, QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useEffect, useEffectEvent, useRef, useState, type DragEvent } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { droppedFiles, type DroppedFile } from './dropped-files';
import { sendFile } from './send-file';
import { uploadListSchema, type UploadList } from './upload-list';
import { UploadTable, type SendingFile } from './upload-table';

const AT_ONCE = 3;

/** Drop zone and list of a study's uploads; the list follows the server by itself and survives a reload. */
export function UploadPanel(props: {
  studyId: string;
  initial: UploadList;
  mayUpload: boolean;
  mayRetry: boolean;
}) {
  const [client] = useState(() => new QueryClient());
  return (
    <QueryClientProvider client={client}>
      <Panel {...props} client={client} />
    </QueryClientProvider>
  );
}

function Panel({
  studyId,
  initial,
  mayUpload,
  mayRetry,
  client,
}: {
  studyId: string;
  initial: UploadList;
  mayUpload: boolean;
  mayRetry: boolean;
  client: QueryClient;
}) {
  const base = `/api/v1/studies/${studyId}`;
  const [sending, setSending] = useState<SendingFile[]>([]);
  const { data } = useQuery({
    queryKey: ['uploads', studyId],
    queryFn: async () => uploadListSchema.parse(await (await fetch(`${base}/uploads`)).json()),
    initialData: initial,
    staleTime: Infinity,
  });

  useEffect(() => {
    const events = new EventSource(`${base}/progress`);
    events.onmessage = (event: MessageEvent<string>) => {
      const list = uploadListSchema.safeParse(JSON.parse(event.data));
      if (list.success) client.setQueryData(['uploads', studyId], list.data);
    };
    return () => events.close();
  }, [base, client, studyId]);

  async function send(files: DroppedFile[]) {
    const drop = crypto.randomUUID();
    const queue = files.map((each, index) => ({ ...each, key: `${drop}-${index}` }));
    setSending((before) => [
      ...queue.map(({ key, path, file }) => ({ key, path, bytes: file.size, sent: 0, problem: null })),
      ...before,
    ]);
    const update = (key: string, change: Partial<SendingFile>) =>
      setSending((before) => before.map((each) => (each.key === key ? { ...each, ...change } : each)));
    const worker = async () => {
      for (let next = queue.shift(); next; next = queue.shift()) {
        const { key, path, file } = next;
        const address = `${base}/uploads?${new URLSearchParams({ name: path, drop })}`;
        try {
          await sendFile(address, file, (sent) => update(key, { sent }));
          setSending((before) => before.filter((each) => each.key !== key));
        } catch (error) {
          update(key, { problem: error instanceof Error ? error.message : String(error) });
        }
      }
    };
    await Promise.all(Array.from({ length: AT_ONCE }, worker));
    await client.invalidateQueries({ queryKey: ['uploads', studyId] });
  }

  async function retry(uploadId: string) {
    await fetch(`${base}/uploads/${uploadId}/retry`, { method: 'POST' });
    await client.invalidateQueries({ queryKey: ['uploads', studyId] });
  }

  return (
    <>
      {mayUpload ? (
        <DropZone onFiles={send} />
      ) : (
        <p className="text-small text-ink-2">Your role may look, not upload.</p>
      )}
      <UploadTable studyId={studyId} sending={sending} list={data} onRetry={mayRetry ? retry : null} />
    </>
  );
}

function DropZone({ onFiles }: { onFiles: (files: DroppedFile[]) => void }) {
  const [over, setOver] = useState(false);
  const files = useRef<HTMLInputElement>(null);
  const folder = useRef<HTMLInputElement>(null);
  const chosen = (input: HTMLInputElement) => {
    onFiles([...(input.files ?? [])].map((file) => ({ path: file.webkitRelativePath || file.name, file })));
    input.value = '';
  };
  // Files chosen while the page was still waking up would wait for ever.
  const takeWaiting = useEffectEvent(() => {
    for (const input of [files.current, folder.current]) if (input?.files?.length) chosen(input);
  });
  useEffect(() => takeWaiting(), []);
  async function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    onFiles(await droppedFiles(event.dataTransfer));
  }
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={(event) => void drop(event)}
      className={classNames('border border-dashed border-rule-strong px-5 py-6', over && 'bg-page-sunk')}
    >
      <p className="font-serif text-head">Drop outputs and XYZ files here</p>
      <p className="mt-1 mb-3 max-w-[62ch] text-small text-ink-2">
        Files, folders, zip, gz and tar.gz. Outputs of ORCA, Gaussian, NWChem and Psi4, XYZ and CSV are told
        apart by content; anything else is refused by name, and the rest is read.
      </p>
      <div className="flex flex-wrap gap-3">
        <Button kind="main" onClick={() => files.current?.click()}>
          Choose files
        </Button>
        <Button onClick={() => folder.current?.click()}>Choose a folder</Button>
      </div>
      <input
        ref={files}
        type="file"
        multiple
        className="sr-only"
        tabIndex={-1}
        aria-label="Files to upload"
        onChange={(event) => chosen(event.currentTarget)}
      />
      <input
        ref={folder}
        type="file"
        multiple
        {...{ webkitdirectory: '' }}
        className="sr-only"
        tabIndex={-1}
        aria-label="Folder to upload"
        onChange={(event) => chosen(event.currentTarget)}
      />
    </div>
  );
}
