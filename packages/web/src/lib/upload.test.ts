import { delay, http, HttpResponse } from 'msw';
import { makeMe } from '../testing/make-me';
import { server } from '../testing/server';
import { access } from './access';
import { uploadPhoto } from './upload';

const photo = {
  id: 'p1',
  width: 4,
  height: 3,
  bytes: 5,
  contentType: 'image/jpeg',
  caption: null,
  marks: [],
  urls: { thumb: 't', screen: 's', full: 'f' },
};
const signedIn = (accessToken: string) => ({ accessToken, expiresIn: 900, user: makeMe() });
const refusal = (status: number, title: string) => HttpResponse.json({ title, status }, { status });
const file = () => new File(['bytes'], 'hole-7.jpg', { type: 'image/jpeg' });

beforeEach(() => access.take(signedIn('old')));

it('sends a photo with its key and says when it is there', async () => {
  const keys: (string | null)[] = [];
  server.use(
    http.post('*/api/photos', ({ request }) => {
      keys.push(request.headers.get('idempotency-key'));
      return HttpResponse.json(photo, { status: 201 });
    }),
  );
  const shares: number[] = [];
  const sent = await uploadPhoto(file(), { key: 'of-the-draft', onProgress: (share) => shares.push(share) });
  expect(sent.id).toBe('p1');
  expect(keys).toEqual(['of-the-draft']);
  expect(shares.at(-1)).toBe(1);
});

it('renews a refused token and sends the same photo with the same key', async () => {
  const seen: (string | null)[][] = [];
  server.use(
    http.post('*/api/photos', ({ request: { headers } }) => {
      seen.push([headers.get('authorization'), headers.get('idempotency-key')]);
      return seen.length === 1 ? refusal(401, 'Sign in first.') : HttpResponse.json(photo, { status: 201 });
    }),
    http.post('*/api/auth/refresh', () => HttpResponse.json(signedIn('new'))),
  );
  await uploadPhoto(file());
  expect(seen.map(([token]) => token)).toEqual(['Bearer old', 'Bearer new']);
  expect(seen[1]![1]).toBe(seen[0]![1]);
});

it('says why a photo is refused', async () => {
  server.use(http.post('*/api/photos', () => refusal(413, 'This picture has more than 50 megapixels.')));
  await expect(uploadPhoto(file())).rejects.toMatchObject({
    status: 413,
    title: 'This picture has more than 50 megapixels.',
  });
});

it('tells a lost network from a refusal', async () => {
  server.use(http.post('*/api/photos', () => HttpResponse.error()));
  await expect(uploadPhoto(file())).rejects.toMatchObject({ isOffline: true });
});

it.each(['before', 'while'])('stops when it is told to %s it is sent', async (when) => {
  server.use(http.post('*/api/photos', () => delay('infinite')));
  const stop = new AbortController();
  if (when === 'before') stop.abort();
  const sending = uploadPhoto(file(), { signal: stop.signal });
  stop.abort();
  await expect(sending).rejects.toMatchObject({ name: 'AbortError' });
});
