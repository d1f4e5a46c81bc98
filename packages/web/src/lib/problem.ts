/** One field's fault as the server words it; `path` is dotted, such as `layers.0.thickness`. */
export interface FieldFault {
  readonly path: string;
  readonly message: string;
}

const NO_NETWORK = {
  status: 0,
  title: 'There is no network.',
  detail: 'What you typed is kept on this device. Try again when the network is back.',
};

const PLAIN: Readonly<Record<number, string>> = {
  401: 'Sign in first.',
  403: 'That is not yours to do.',
  404: 'There is nothing at this address.',
  409: 'It does not fit how things stand.',
  413: 'What was sent is too large.',
  429: 'Too many requests. Try again a little later.',
};
const BROKEN = 'Something went wrong at the server. What was saved before is kept.';

/** Whatever the wire refuses, in one form. Without a network `status` is 0. */
export class Problem extends Error {
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  readonly errors: readonly FieldFault[];
  readonly isOffline: boolean;

  constructor(readonly problem: Readonly<Record<string, unknown>>) {
    const title = wordsOf(problem['title']);
    super(title);
    this.name = 'Problem';
    this.title = title;
    this.status = Number(problem['status']);
    this.detail = wordsOf(problem['detail']);
    this.errors = faultsOf(problem['errors']);
    this.isOffline = this.status === 0;
  }

  static noNetwork(): Problem {
    return new Problem(NO_NETWORK);
  }

  /** A proxy or a crash answers in HTML or not at all: then the status alone has to do. */
  static ofAnswer(status: number, body: unknown): Problem {
    const title = PLAIN[status] ?? BROKEN;
    const told = isRecord(body) && typeof body['title'] === 'string' ? body : { title };
    return new Problem({ ...told, status });
  }
}

function wordsOf(value: unknown): string {
  return typeof value === 'string' ? value : '';
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function faultsOf(value: unknown): FieldFault[] {
  if (!Array.isArray(value)) return [];
  return value
    .filter(isRecord)
    .map(({ path, message }) => ({ path: wordsOf(path), message: wordsOf(message) }));
}

/** What to say about a failure of any kind, in one or two sentences. */
export function sentenceOf(error: unknown): string {
  if (!(error instanceof Problem)) return 'Something went wrong on this page. What you typed is still here.';
  return error.detail && error.detail !== error.title ? `${error.title} ${error.detail}` : error.title;
}
