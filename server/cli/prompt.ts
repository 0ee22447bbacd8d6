import { createInterface } from 'node:readline/promises';
import { Writable } from 'node:stream';

/** Asks on the terminal; a secret is not shown while it is typed. */
export async function ask(question: string, secret = false): Promise<string> {
  process.stderr.write(question);
  const nowhere = new Writable({ write: (_chunk, _encoding, next) => next() });
  const lines = createInterface({
    input: process.stdin,
    output: secret ? nowhere : process.stderr,
    terminal: true,
  });
  try {
    return await lines.question('');
  } finally {
    lines.close();
    if (secret) process.stderr.write('\n');
  }
}

/** All of stdin, without the line end that a shell puts behind it. */
export async function readStdin(): Promise<string> {
  const chunks: Buffer[] = [];
  for await (const chunk of process.stdin) chunks.push(Buffer.from(chunk));
  return Buffer.concat(chunks)
    .toString('utf8')
    .replace(/\r?\n$/, '');
}
