import { STATUS_CODES } from 'node:http';
import { HttpException } from '@nestjs/common';
import {
  AppError,
  BadInput,
  Conflict,
  type FieldFault,
  NotAllowed,
  NotFound,
  NotReady,
  NotSignedIn,
  ReadsOnly,
  TooLarge,
  TooMany,
  WrongMethod,
  WrongType,
} from './app-error.js';

/** RFC 9457. */
export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly instance: string;
  readonly errors?: readonly FieldFault[];
  readonly current?: Readonly<Record<string, unknown>>;
  readonly [extra: string]: unknown;
}

const STATUS_OF = new Map<unknown, number>([
  [NotFound, 404],
  [WrongMethod, 405],
  [NotSignedIn, 401],
  [NotAllowed, 403],
  [BadInput, 400],
  [Conflict, 409],
  [TooLarge, 413],
  [WrongType, 415],
  [TooMany, 429],
  [ReadsOnly, 503],
  [NotReady, 503],
]);

const PLAIN: Readonly<Record<number, string>> = {
  400: 'The request could not be read.',
  401: 'Sign in first.',
  403: 'That is not yours to do.',
  404: 'There is nothing at this address.',
  405: 'That cannot be done at this address.',
  406: 'There is no answer in that form.',
  408: 'The request took too long to arrive.',
  409: 'It does not fit how things stand.',
  413: 'What was sent is too large.',
  414: 'The address is too long.',
  415: 'What was sent is of a kind that is not taken here.',
  429: 'Too many requests. Try again a little later.',
  431: 'The headers are too large.',
  500: 'Something went wrong here. What was saved before is kept.',
  503: 'Not ready. Try again in a moment.',
  507: 'The disk is full: nothing was changed. Reading goes on.',
};

/** What SQLite and the file system say, as far as the sender can do something about it. */
const STATUS_OF_CODE: readonly (readonly [RegExp, number])[] = [
  [/^(SQLITE_FULL|ENOSPC|EDQUOT)$/, 507],
  [/^SQLITE_BUSY/, 503],
  // A key that is taken or names nothing: features refuse it first, this is the net under them.
  [/^SQLITE_CONSTRAINT_(UNIQUE|PRIMARYKEY|FOREIGNKEY)$/, 409],
];

/** A feature's own refusal is of the kind that it extends. */
function statusOfOurs(error: AppError): number {
  for (let kind: unknown = error.constructor; kind; kind = Object.getPrototypeOf(kind) as unknown) {
    const status = STATUS_OF.get(kind);
    if (status !== undefined) return status;
  }
  return 500;
}

/** Fastify and its parsers put a status on their errors; SQLite puts a code. */
export function statusOf(error: unknown): number {
  if (error instanceof AppError) return statusOfOurs(error);
  if (error instanceof HttpException) return error.getStatus();
  if (typeof error !== 'object' || error === null) return 500;
  const { code, statusCode } = error as { code?: unknown; statusCode?: unknown };
  const known = typeof code === 'string' ? STATUS_OF_CODE.find(([form]) => form.test(code)) : undefined;
  if (known) return known[1];
  return typeof statusCode === 'number' && statusCode >= 400 && statusCode < 500 ? statusCode : 500;
}

/** Nothing but our own words leaves: a message of a library may name a path, a statement or a line of code. */
export function problemOf(error: unknown, instance: string): Problem {
  const status = statusOf(error);
  if (!(error instanceof AppError)) {
    const detail = PLAIN[status] ?? PLAIN[status < 500 ? 400 : 500]!;
    return { type: 'about:blank', title: STATUS_CODES[status] ?? 'Error', status, detail, instance };
  }
  const { title, message: detail } = error;
  // First, so that no fact named like a member of the problem takes its place.
  return { ...factsOf(error), type: 'about:blank', title, status, detail, instance };
}

function factsOf(error: AppError): Record<string, unknown> {
  if (error instanceof BadInput) return { errors: error.faults };
  if (error instanceof NotReady) return { checks: error.checks };
  if (error instanceof Conflict && error.current) return { ...error.current, current: error.current };
  return {};
}
