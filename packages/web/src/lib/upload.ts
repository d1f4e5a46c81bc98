import { photoSchema, type Photo } from '@rivetside/shared';
import { access } from './access';
import { Problem } from './problem';
import { randomKey } from './random-key';

interface Uploading {
  /** 0 to 1, of what has left this device. */
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
  readonly key?: string;
}

/** fetch tells nothing of how far an upload has come: hence the older way. */
function sendOnce(file: Blob, key: string, { onProgress, signal }: Uploading): Promise<XMLHttpRequest> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    const stop = () => {
      request.abort();
      reject(new DOMException('The upload was stopped.', 'AbortError'));
    };
    if (signal?.aborted) return stop();
    signal?.addEventListener('abort', stop, { once: true });
    request.upload.addEventListener('progress', ({ loaded, total, lengthComputable }) => {
      if (lengthComputable && total > 0) onProgress?.(loaded / total);
    });
    request.addEventListener('load', () => resolve(request));
    request.addEventListener('error', () => reject(Problem.noNetwork()));
    request.addEventListener('loadend', () => signal?.removeEventListener('abort', stop));
    request.open('POST', '/api/photos');
    request.setRequestHeader('idempotency-key', key);
    const token = access.token();
    if (token) request.setRequestHeader('authorization', `Bearer ${token}`);
    const form = new FormData();
    form.append('file', file, file instanceof File ? file.name : 'photo');
    request.send(form);
  });
}

function bodyOf(request: XMLHttpRequest): unknown {
  try {
    return JSON.parse(request.responseText);
  } catch {
    return undefined;
  }
}

/** Sends one photo; stopped by the signal, refused with a Problem, and as patient with a lost session as any write. */
export async function uploadPhoto(file: Blob, options: Uploading = {}): Promise<Photo> {
  const key = options.key ?? randomKey();
  const used = access.token();
  let request = await sendOnce(file, key, options);
  if (request.status === 401 && used !== null) {
    if ((await access.refresh(used)) === null) await access.lost();
    request = await sendOnce(file, key, options);
  }
  if (request.status < 200 || request.status > 299) throw Problem.ofAnswer(request.status, bodyOf(request));
  options.onProgress?.(1);
  return photoSchema.parse(bodyOf(request));
}
