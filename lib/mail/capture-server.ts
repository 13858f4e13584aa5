import { randomUUID } from 'node:crypto';
import { mkdir, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

/** A mail as the capture server keeps it. */
export interface CapturedMail {
  from: string;
  to: string;
  subject: string;
  text: string;
  html: string;
  date: string;
}

/**
 * A mail server for development and the demo: takes every mail on loopback and writes it to a folder
 * instead of sending it.
 */
export function startCaptureServer(folder: string, port: number): Promise<SMTPServer> {
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    onData(stream, _session, done) {
      keep(folder, stream).then(() => done(), done);
    },
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}

async function keep(folder: string, stream: NodeJS.ReadableStream): Promise<void> {
  const chunks: Uint8Array[] = [];
  for await (const chunk of stream) chunks.push(chunk as Uint8Array);
  const mail = await simpleParser(Buffer.concat(chunks));
  const to = mail.to === undefined ? [] : Array.isArray(mail.to) ? mail.to : [mail.to];
  const captured: CapturedMail = {
    from: mail.from?.text ?? '',
    to: to.map((address) => address.text).join(', '),
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || '',
    date: new Date().toISOString(),
  };
  await mkdir(folder, { recursive: true });
  const name = `${captured.date.replaceAll(':', '-')}-${randomUUID()}.json`;
  // Renamed when whole: a page that lists the folder never sees half a mail.
  await writeFile(path.join(folder, `.${name}`), JSON.stringify(captured));
  await rename(path.join(folder, `.${name}`), path.join(folder, name));
}
