import type { AddressInfo } from 'node:net';
import { createServer, type Server, type Socket } from 'node:net';

export interface ReceivedMail {
  from: string;
  to: string[];
  data: string;
}

/** A mail server small enough to read: takes what it is given, or refuses every recipient. */
export class FakeMailServer {
  readonly received: ReceivedMail[] = [];
  refuse = false;
  private readonly sockets = new Set<Socket>();

  private constructor(private readonly server: Server) {}

  static async start(): Promise<FakeMailServer> {
    const server = createServer();
    const fake = new FakeMailServer(server);
    server.on('connection', (socket) => fake.talk(socket));
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    return fake;
  }

  get url(): string {
    return `smtp://127.0.0.1:${(this.server.address() as AddressInfo).port}`;
  }

  async stop(): Promise<void> {
    for (const socket of this.sockets) socket.destroy();
    await new Promise((resolve) => this.server.close(resolve));
  }

  private talk(socket: Socket): void {
    this.sockets.add(socket);
    const say = (line: string) => socket.write(`${line}\r\n`);
    let mail: ReceivedMail = { from: '', to: [], data: '' };
    let inData = false;
    let rest = '';
    const line = (text: string): void => {
      if (inData) {
        if (text !== '.') {
          mail.data += `${text}\n`;
          return;
        }
        inData = false;
        this.received.push(mail);
        mail = { from: '', to: [], data: '' };
        say('250 kept');
      } else if (/^(EHLO|HELO)/i.test(text)) say('250 test');
      else if (/^MAIL FROM:/i.test(text)) {
        mail.from = text.slice(10);
        say('250 ok');
      } else if (/^RCPT TO:/i.test(text)) {
        if (!this.refuse) mail.to.push(text.slice(8));
        say(this.refuse ? '550 no such mailbox' : '250 ok');
      } else if (/^DATA/i.test(text)) {
        inData = true;
        say('354 go on');
      } else if (/^QUIT/i.test(text)) {
        say('221 bye');
        socket.end();
      } else say('250 ok');
    };
    socket.on('error', () => socket.destroy());
    socket.on('data', (chunk) => {
      const lines = (rest + chunk.toString('utf8')).split('\r\n');
      rest = lines.pop() ?? '';
      for (const text of lines) line(text);
    });
    say('220 test');
  }
}
