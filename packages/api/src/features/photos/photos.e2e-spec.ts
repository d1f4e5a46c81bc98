import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { deflateSync } from 'node:zlib';
import type { Photo } from '@rivetside/shared';
import sharp from 'sharp';
import supertest from 'supertest';
import type { TestUser } from '../../testing/create-account.js';
import type { Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { PhotosService } from './photos.service.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

const picture = (width = 640, height = 480) =>
  sharp({ create: { width, height, channels: 3, background: '#8a9a5b' } });
const upload = (user: TestUser, bytes: Buffer, name = 'hole.jpg') =>
  test.as(user).post('/photos').attach('file', bytes, name);
const stored = async (user: TestUser): Promise<Photo> => {
  const { body } = await upload(user, await picture().jpeg().toBuffer()).expect(201);
  return body as Photo;
};
const fetched = (address: string) => supertest(test.server).get(address);
const filesStored = () => {
  const folder = join(test.settings.dataDir, 'photos');
  return existsSync(folder)
    ? readdirSync(folder, { recursive: true }).filter((name) => String(name).endsWith('.jpg'))
    : [];
};

/** A PNG whose head promises many pixels: small as a file, large as a picture. */
function pngHead(width: number, height: number): Buffer {
  const chunk = (type: string, data: Buffer) => {
    const length = Buffer.alloc(4);
    length.writeUInt32BE(data.length);
    return Buffer.concat([length, Buffer.from(type), data, Buffer.alloc(4)]);
  };
  const head = Buffer.alloc(13);
  head.writeUInt32BE(width, 0);
  head.writeUInt32BE(height, 4);
  head.set([8, 2, 0, 0, 0], 8);
  const signature = Buffer.from('89504e470d0a1a0a', 'hex');
  return Buffer.concat([
    signature,
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(Buffer.alloc(100))),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

describe('a photo', () => {
  it('is taken from nobody who is not signed in', async () => {
    await test.guest
      .post('/photos')
      .attach('file', await picture().jpeg().toBuffer(), 'hole.jpg')
      .expect(401);
  });

  it.each([
    ['an SVG', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>'), 415],
    [
      'an SVG that calls itself JPEG',
      Buffer.from('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"/>'),
      415,
    ],
    ['a page', Buffer.from('<!doctype html><script>alert(1)</script>'), 415],
    ['nothing', Buffer.alloc(0), 415],
    ['a picture of more than 50 megapixels', pngHead(30_000, 30_000), 413],
    ['more than 12 MB', Buffer.alloc(12 * 1024 * 1024 + 1, 7), 413],
  ])('is not %s', async (_, bytes, status) => {
    const before = filesStored().length;
    await upload(bench.builder, bytes).expect(status);
    expect(filesStored()).toHaveLength(before);
  });

  it('is not one that broke off', async () => {
    const whole = await picture(800, 600).jpeg().toBuffer();
    await upload(bench.builder, whole.subarray(0, whole.length / 2)).expect(415);
  });

  it('comes in the field `file`, as multipart', async () => {
    const bytes = await picture().jpeg().toBuffer();
    const { body } = await test
      .as(bench.builder)
      .post('/photos')
      .attach('picture', bytes, 'hole.jpg')
      .expect(400);
    expect(body.errors[0].path).toBe('file');
    await test.as(bench.builder).post('/photos').send({ file: 'x' }).expect(415);
  });

  it.each(['jpeg', 'png', 'webp'] as const)(
    'may be %s, and is kept upright, in three sizes, without place or device',
    async (format) => {
      const bytes = await picture(2_000, 1_000)
        .withExif({ IFD0: { Make: 'Phone' }, IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '50/1 20/1 0/1' } })
        .withMetadata({ orientation: 6 })
        [format]()
        .toBuffer();
      const { body } = await upload(bench.builder, bytes).expect(201);
      const photo = body as Photo;
      expect(photo).toMatchObject({ width: 1_000, height: 2_000, contentType: 'image/jpeg' });
      const wide = { thumb: 320, screen: 1_600, full: 2_000 };
      for (const size of ['thumb', 'screen', 'full'] as const) {
        const { body: shown } = await fetched(photo.urls[size])
          .expect(200)
          .expect('content-type', /image\/jpeg/);
        const { height, exif, orientation } = await sharp(shown as Buffer).metadata();
        expect({ height, exif, orientation }).toEqual({
          height: wide[size],
          exif: undefined,
          orientation: undefined,
        });
      }
    },
  );

  it('is told its caption by its owner alone', async () => {
    const { id } = await stored(bench.builder);
    await test.as(bench.mentors[0]).patch(`/photos/${id}`).send({ caption: 'Mine' }).expect(404);
    const { body } = await test
      .as(bench.builder)
      .patch(`/photos/${id}`)
      .send({ caption: 'The row, square on' })
      .expect(200);
    expect(body.caption).toBe('The row, square on');
  });
});

describe('the address of a photo', () => {
  it('shows it to an <img>, as nothing but a picture', async () => {
    const { urls } = await stored(bench.builder);
    await fetched(urls.thumb)
      .expect(200)
      .expect('x-content-type-options', 'nosniff')
      .expect('content-security-policy', "default-src 'none'; sandbox");
  });

  it('works for its size and time only', async () => {
    const { urls } = await stored(bench.builder);
    await fetched(urls.thumb.replace('/thumb?', '/full?')).expect(404);
    await fetched(urls.thumb.replace(/signature=.*/, 'signature=AAAA')).expect(404);
    await fetched(urls.thumb.replace(/until=\d+/, 'until=99999999999')).expect(404);
    test.clock.advance(2 * 3_600_000);
    await fetched(urls.thumb).expect(404);
    test.clock.advance(-2 * 3_600_000);
  });
});

describe('a photo on a question', () => {
  it('is one’s own, hangs in one place, and then stays', async () => {
    const strange = await stored(bench.mentors[0]);
    const asked = test.create.asking(bench, { photoIds: [strange.id] });
    const refused = await test.as(bench.builder).post('/questions').send(asked).expect(400);
    expect(refused.body.errors[0].path).toBe('photoIds');
    const own = await stored(bench.builder);
    const question = await test.create.question(bench, { photoIds: [own.id] });
    expect(question.photos.map(({ id }) => id)).toEqual([own.id]);
    await test
      .as(bench.builder)
      .post(`/questions/${question.id}/messages`)
      .send({ body: 'Again', photoIds: [own.id] })
      .expect(400);
    await test.as(bench.builder).delete(`/photos/${own.id}`).expect(409);
  });

  it('comes with the line that brought it', async () => {
    const question = await test.create.question(bench);
    const photo = await stored(bench.mentors[0]);
    const { body } = await test
      .as(bench.mentors[0])
      .post(`/questions/${question.id}/messages`)
      .send({ body: 'Like this', photoIds: [photo.id] })
      .expect(201);
    expect(body.data.photos[0]).toMatchObject({ id: photo.id });
    const sheet = await test.as(bench.builder).get(`/questions/${question.id}`).expect(200);
    expect(sheet.body.events.at(-1).data.photos[0].id).toBe(photo.id);
  });
});

describe('a photo that hangs nowhere', () => {
  it('is discarded by its owner, files and all', async () => {
    const { id, urls } = await stored(bench.builder);
    await test.as(bench.mentors[0]).delete(`/photos/${id}`).expect(404);
    await test.as(bench.builder).delete(`/photos/${id}`).expect(204);
    await fetched(urls.thumb).expect(404);
  });

  it('is swept after a day, and not before', async () => {
    const { urls } = await stored(bench.builder);
    const job = test.app.get(PhotosService);
    await job.sweepUnused();
    await fetched(urls.thumb).expect(200);
    test.clock.advance(25 * 3_600_000);
    await job.sweepUnused();
    test.clock.advance(-25 * 3_600_000);
    await fetched(urls.thumb).expect(404);
  });
});
