import { studyOfRequest } from '@/app/_server/study-of-request';
import { readUploadList } from '@/app/_server/upload-list';
import { listenToProgress } from '@/lib/queue/progress';

const LOOK_EVERY_MS = 5_000;
const AT_MOST_EVERY_MS = 250;

/** The study's uploads as server-sent events: a snapshot at once, and another after every change. */
export async function GET(request: Request, { params }: RouteContext<'/api/v1/studies/[studyId]/progress'>) {
  const found = await studyOfRequest(request, 'read', (await params).studyId);
  if (!found.ok) return found.error;
  const { actor, study } = found.value;
  const encoder = new TextEncoder();
  let close = () => {};
  const stream = new ReadableStream<Uint8Array>({
    async start(controller) {
      let open = true;
      let sending: Promise<void> = Promise.resolve();
      let due: NodeJS.Timeout | undefined;
      const send = () => {
        due = undefined;
        // One after the other: an older snapshot never overtakes a newer one.
        sending = sending
          .then(async () => {
            if (!open) return;
            const list = await readUploadList(actor, study.id);
            if (open) controller.enqueue(encoder.encode(`data: ${JSON.stringify(list)}\n\n`));
          })
          .catch((error: unknown) => {
            console.error('sending progress failed', error);
            close();
          });
      };
      const soon = () => {
        due ??= setTimeout(send, AT_MOST_EVERY_MS);
      };
      const listening = await listenToProgress(actor.groupId, study.id, soon);
      // The message of a change can be lost; looking by itself now and then finds what was missed.
      const timer = setInterval(soon, LOOK_EVERY_MS);
      close = () => {
        if (!open) return;
        open = false;
        clearInterval(timer);
        clearTimeout(due);
        listening.stop();
        controller.close();
      };
      request.signal.addEventListener('abort', () => close());
      send();
    },
    cancel: () => close(),
  });
  return new Response(stream, {
    headers: { 'content-type': 'text/event-stream', 'cache-control': 'no-cache, no-transform' },
  });
}
