import type { Socket } from 'node:net';
import { type Problem, problemOf } from '../../contract/problem.ts';
import { rawProblem } from '../problems.ts';

interface ParserError extends Error {
  readonly code?: string | undefined;
  readonly rawPacket?: unknown;
}

/** Sockets on which the last answer is written: what the parser finds behind it is not answered a second time. */
export const lastAnswers = new WeakSet<object>();

/** Answers bytes that never became a request: one problem, and the connection closes. */
export function clientError(error: ParserError, socket: Socket): void {
  if (error.code === 'ECONNRESET' || socket.destroyed) return;
  if (socket.writable && !lastAnswers.has(socket)) socket.end(rawProblem(parserProblem(error)), () => socket.destroy());
  else socket.destroySoon();
}

function parserProblem({ code, rawPacket }: ParserError): Problem {
  switch (code) {
    case 'HPE_HEADER_OVERFLOW':
      return firstLineFills(rawPacket)
        ? problemOf('too-long', 'The request target is too long.')
        : problemOf('headers-too-large', 'The header fields are too large.');
    case 'HPE_CHUNK_EXTENSIONS_OVERFLOW':
      return problemOf('too-large', 'The chunk extensions are too large.');
    case 'ERR_HTTP_REQUEST_TIMEOUT':
      return problemOf('too-slow', 'The request did not arrive in time.');
    default:
      return problemOf('unreadable', 'The bytes are not an HTTP request.');
  }
}

/** Whether the request line alone is what overflowed: no line break in its first 4 KiB. */
function firstLineFills(packet: unknown): boolean {
  return packet instanceof Uint8Array && packet.subarray(0, 4096).indexOf(0x0a) < 0;
}
