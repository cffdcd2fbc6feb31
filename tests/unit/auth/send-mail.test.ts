/** Messages over SMTP, held against a server of a few lines that keeps what it is told. */
import { createServer, type Server, type Socket } from 'node:net';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Db } from '@/db/client';

const MESSAGE = {
  to: 'ada.reed@waypost.test',
  subject: 'Sign in',
  paragraphs: ['With this link:', 'http://localhost/x'],
};

let server: Server | undefined;

afterEach(() => {
  vi.unstubAllEnvs();
  server?.close();
});

/** A mail server that takes or refuses every recipient; gives the lines it was sent. */
async function mailServer(recipient: string): Promise<readonly string[]> {
  const lines: string[] = [];
  server = createServer((socket) => converse(socket, recipient, lines)).listen(0, '127.0.0.1');
  await new Promise((resolve) => server?.once('listening', resolve));
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('no port');
  vi.stubEnv('SMTP_URL', `smtp://127.0.0.1:${address.port}`);
  vi.resetModules();
  return lines;
}

function converse(socket: Socket, recipient: string, lines: string[]): void {
  let isData = false;
  const answer = (line: string): string | undefined => {
    if (isData) {
      isData = line !== '.';
      return isData ? undefined : '250 taken';
    }
    if (line.startsWith('RCPT')) return recipient;
    isData = line === 'DATA';
    return isData ? '354 go on' : line === 'QUIT' ? '221 bye' : '250 ok';
  };
  socket.write('220 here\r\n');
  socket.on('data', (chunk) => {
    for (const line of chunk.toString().split('\r\n').slice(0, -1)) {
      lines.push(line);
      const said = answer(line);
      if (said !== undefined) socket.write(`${said}\r\n`);
    }
  });
}

async function send(): Promise<void> {
  const { sendMail } = await import('@/lib/mail/send-mail');
  // A mail server is set: the database is not asked.
  await sendMail({} as Db, MESSAGE);
}

describe('a message over SMTP', () => {
  it('reaches the server whole', async () => {
    const lines = await mailServer('250 ok');
    await send();
    for (const part of ['RCPT TO:<ada.reed@waypost.test>', 'Subject: Sign in', 'http://localhost/x']) {
      expect(lines).toContain(part);
    }
  });

  it('that is refused says so without the address', async () => {
    await mailServer('550 no such <ada.reed@waypost.test>');
    await expect(send()).rejects.toThrow('the mail server took no message (EENVELOPE)');
  });
});
