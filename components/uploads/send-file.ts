import { z } from 'zod';

const problemSchema = z.object({ error: z.object({ message: z.string() }) });

/** Sends one file as the raw body; `onSent` hears the bytes sent so far. Rejects with a sentence for the person. */
export function sendFile(address: string, file: File, onSent: (bytes: number) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    // fetch does not tell how much of a body has been sent.
    const request = new XMLHttpRequest();
    request.open('PUT', address);
    request.upload.onprogress = (event) => onSent(event.loaded);
    request.onload = () => {
      if (request.status === 200) return resolve();
      reject(new Error(sentence(request)));
    };
    request.onerror = () =>
      reject(new Error('The connection broke off. The file was not taken; send it again.'));
    request.send(file);
  });
}

function sentence(request: XMLHttpRequest): string {
  try {
    const parsed = problemSchema.safeParse(JSON.parse(request.responseText));
    if (parsed.success) return parsed.data.error.message;
  } catch {
    // Not JSON: a proxy or a broken server answered; the status has to do.
  }
  return `The server answered with status ${request.status}. The file was not taken; send it again.`;
}
