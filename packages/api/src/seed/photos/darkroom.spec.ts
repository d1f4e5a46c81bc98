import sharp from 'sharp';
import { readSeedWorld } from '../seed-world.js';
import { type Draw, openDarkroom } from './darkroom.js';
import { POINTS_HIGH, POINTS_WIDE } from './frame.js';
import { SCENES } from './scenes.js';

const shots = readSeedWorld().questions.flatMap(({ photos, holeCard: card }) =>
  photos.map((photo) => ({ photo, card })),
);
const shotOf = (key: string) => shots.find(({ photo }) => photo.key === key)!;
let draw: Draw;
beforeAll(async () => {
  draw = await openDarkroom();
});

/** How dark the picture is in a small window about a place in it. */
async function greyAt(picture: Buffer, { x, y }: { x: number; y: number }): Promise<number> {
  const window = {
    left: Math.round(x * POINTS_WIDE) - 6,
    top: Math.round(y * POINTS_HIGH) - 6,
    width: 12,
    height: 12,
  };
  const { channels } = await sharp(await sharp(picture).extract(window).grayscale().toBuffer()).stats();
  return channels[0]!.mean;
}

describe('the drawn photos', () => {
  it('are one for each that the questions name, and none beside', () => {
    expect(Object.keys(SCENES).sort()).toEqual(shots.map(({ photo }) => photo.key).sort());
  });

  it.each(shots.map((shot) => [shot.photo.key, shot] as const))(
    'show something, with light and dark in it: %s',
    async (_, shot) => {
      const picture = await draw(shot);
      const { width, height, format } = await sharp(picture).metadata();
      expect([width, height, format]).toEqual([POINTS_WIDE, POINTS_HIGH, 'jpeg']);
      const { channels } = await sharp(picture).stats();
      const { mean, stdev } = channels[0]!;
      expect(mean).toBeGreaterThan(50);
      expect(mean).toBeLessThan(230);
      expect(stdev).toBeGreaterThan(12);
    },
  );

  it('are the same at every start', async () => {
    const shot = shotOf('STB-Q-001/1');
    const again = await openDarkroom();
    expect((await draw(shot)).equals(await again(shot))).toBe(true);
  });

  // The mark is where a reader is told to look.
  it.each(['CTR-Q-001/1', 'WBX-Q-001/1', 'STB-Q-001/3'])(
    'have the hole where the mark is: %s',
    async (key) => {
      const shot = shotOf(key);
      const picture = await draw(shot);
      const mark = shot.photo.marks[0]!;
      expect(await greyAt(picture, mark)).toBeLessThan(45);
      expect(await greyAt(picture, { x: mark.x, y: mark.y - 0.08 })).toBeGreaterThan(70);
    },
  );

  it('cannot be drawn to scale without the number that gives the scale', async () => {
    const { photo } = shotOf('STB-Q-003/1');
    await expect(draw({ photo, card: null })).rejects.toThrow('edge distance');
  });
});
