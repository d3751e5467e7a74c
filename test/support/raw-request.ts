import { connect } from 'node:net';

export interface RawAnswer {
  /** everything the server sent before it closed or fell silent */
  readonly text: string;
  readonly closed: boolean;
}

/** Sends bytes over a socket and gathers what comes back until the server closes or is silent for a while. */
export function rawRequest(port: number, bytes: string | Uint8Array, silence = 400): Promise<RawAnswer> {
  return new Promise((resolve, reject) => {
    const socket = connect(port, '127.0.0.1', () => socket.write(bytes));
    const pieces: Buffer[] = [];
    socket.setTimeout(silence);
    const end = (closed: boolean) => {
      resolve({ text: Buffer.concat(pieces).toString('latin1'), closed });
      socket.destroy();
    };
    socket.on('data', (piece) => pieces.push(piece));
    socket.on('end', () => end(true));
    socket.on('timeout', () => end(false));
    socket.on('error', (error: NodeJS.ErrnoException) => (error.code === 'ECONNRESET' ? end(true) : reject(error)));
  });
}

/** The answers in what a server sent: status, headers in lower case, body by Content-Length. */
export function answersIn(text: string): { statusCode: number; headers: Record<string, string>; body: string }[] {
  const answers = [];
  let rest = text;
  while (rest.startsWith('HTTP/1.1 ')) {
    const end = rest.indexOf('\r\n\r\n');
    const [first = '', ...lines] = rest.slice(0, end).split('\r\n');
    const headers = Object.fromEntries(
      lines.map((line) => [line.slice(0, line.indexOf(':')).toLowerCase(), line.slice(line.indexOf(':') + 1).trim()]),
    );
    const length = Number(headers['content-length'] ?? 0);
    answers.push({ statusCode: Number(first.slice(9, 12)), headers, body: rest.slice(end + 4, end + 4 + length) });
    rest = rest.slice(end + 4 + length);
  }
  return answers;
}
