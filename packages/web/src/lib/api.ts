import { access } from './access';
import { Problem } from './problem';
import { randomKey } from './random-key';

export { Problem } from './problem';

/** As much of a zod schema as the wire needs. */
interface Answer<T> {
  parse(body: unknown): T;
}
interface Reading<T> {
  readonly answer?: Answer<T>;
  readonly signal?: AbortSignal | undefined;
}
interface Writing<T> extends Reading<T> {
  readonly body?: unknown;
  /** The Idempotency-Key, for a write that outlives this call; otherwise a fresh one is made. */
  readonly key?: string | undefined;
}
interface Sending {
  readonly method: string;
  readonly path: string;
  readonly body: string | undefined;
  readonly key: string | undefined;
  readonly signal: AbortSignal | undefined;
}

const PAUSE_MS = 400;
/** Answers of a server that is starting or of a proxy before it: the same write may be sent once more. */
const PASSING = new Set([502, 503, 504]);

function headersOf({ body, key }: Sending, token: string | null): Headers {
  const headers = new Headers({ accept: 'application/json' });
  if (body !== undefined) headers.set('content-type', 'application/json');
  if (key) headers.set('idempotency-key', key);
  if (token) headers.set('authorization', `Bearer ${token}`);
  return headers;
}

async function once(sending: Sending, token: string | null): Promise<Response> {
  const { method, path, body, signal } = sending;
  try {
    return await fetch(`/api${path}`, {
      method,
      headers: headersOf(sending, token),
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body }),
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    if (signal?.aborted) throw error;
    throw Problem.noNetwork();
  }
}

/** Sent again at most once, and only with a key: whoever is not signed in has none that the server would know. */
async function patiently(sending: Sending, token: string | null): Promise<Response> {
  const mayRepeat = token !== null && sending.key !== undefined && navigator.onLine;
  const first = await once(sending, token).catch((error: unknown) => {
    if (mayRepeat && error instanceof Problem) return null;
    throw error;
  });
  if (first && !(mayRepeat && PASSING.has(first.status))) return first;
  await new Promise((resolve) => setTimeout(resolve, PAUSE_MS));
  return once(sending, token);
}

/** The refusal of a lost session: one new token, then the dialog, and in the end the same request once more. */
async function signedIn(sending: Sending): Promise<Response> {
  const used = access.token();
  const answer = await patiently(sending, used);
  if (answer.status !== 401 || used === null || sending.path.startsWith('/auth/')) return answer;
  const renewed = await access.refresh(used);
  if (renewed !== null) {
    const again = await patiently(sending, access.token());
    if (again.status !== 401) return again;
  }
  await access.lost();
  return patiently(sending, access.token());
}

async function send<T>(method: string, path: string, options: Writing<T>): Promise<T> {
  const response = await signedIn({
    method,
    path,
    body: options.body === undefined ? undefined : JSON.stringify(options.body),
    key: method === 'GET' ? undefined : (options.key ?? randomKey()),
    signal: options.signal,
  });
  const body: unknown = await bodyOf(response);
  if (!response.ok) throw Problem.ofAnswer(response.status, body);
  return options.answer ? read(options.answer, body) : (undefined as T);
}

async function bodyOf(response: Response): Promise<unknown> {
  const text = await response.text().catch(() => {
    throw Problem.noNetwork();
  });
  try {
    return text === '' ? undefined : JSON.parse(text);
  } catch {
    return undefined;
  }
}

function read<T>(answer: Answer<T>, body: unknown): T {
  try {
    return answer.parse(body);
  } catch (cause) {
    const detail = 'Load the page again. What you typed is kept where the page says so.';
    const problem = new Problem({ status: 500, title: 'The server answers in a newer form.', detail });
    problem.cause = cause;
    throw problem;
  }
}

export const api = {
  get: <T = void>(path: string, options: Reading<T> = {}) => send('GET', path, options),
  post: <T = void>(path: string, options: Writing<T> = {}) => send('POST', path, options),
  put: <T = void>(path: string, options: Writing<T> = {}) => send('PUT', path, options),
  patch: <T = void>(path: string, options: Writing<T> = {}) => send('PATCH', path, options),
  delete: <T = void>(path: string, options: Writing<T> = {}) => send('DELETE', path, options),
};

type QueryValue = string | number | boolean | null | undefined;

/** `?a=1&b=x&b=y`, or nothing at all; what is absent, null or empty is left out. */
export function queryString(values: Readonly<Record<string, QueryValue | readonly QueryValue[]>>): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(values))
    for (const one of Array.isArray(value) ? value : [value])
      if (one !== undefined && one !== null && one !== '') query.append(name, String(one));
  const text = query.toString();
  return text === '' ? '' : `?${text}`;
}
