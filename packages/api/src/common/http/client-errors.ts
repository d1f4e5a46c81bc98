import { STATUS_CODES } from 'node:http';
import type { Socket } from 'node:net';

const STATUS_OF_CODE: Readonly<Record<string, number>> = {
  HPE_HEADER_OVERFLOW: 431,
  ERR_HTTP_REQUEST_TIMEOUT: 408,
};
const DETAIL: Readonly<Record<number, string>> = {
  400: 'This is not a request that can be read.',
  408: 'The request took too long to arrive.',
  431: 'The headers are too large.',
};

/** What Node's own parser refuses never becomes a request: it is answered on the bare socket, in the same form. */
export function answerClientError(error: Error & { code?: string }, socket: Socket): void {
  if (error.code === 'ECONNRESET' || socket.destroyed) return;
  if (!socket.writable) {
    socket.destroy();
    return;
  }
  const status = STATUS_OF_CODE[error.code ?? ''] ?? 400;
  const body = JSON.stringify({
    type: 'about:blank',
    title: STATUS_CODES[status],
    status,
    detail: DETAIL[status],
    instance: '/',
  });
  const head = [
    `HTTP/1.1 ${status} ${STATUS_CODES[status]}`,
    'content-type: application/problem+json; charset=utf-8',
    `content-length: ${Buffer.byteLength(body)}`,
    'x-content-type-options: nosniff',
    'connection: close',
  ];
  socket.end(`${head.join('\r\n')}\r\n\r\n${body}`);
}
