import sharp from 'sharp';
import {
  HIGH,
  type Lot,
  lotsOf,
  type Picture,
  POINTS_HIGH,
  POINTS_WIDE,
  type Shot,
  type Skin,
  WIDE,
} from './frame.js';
import { DEFS } from './grounds.js';
import { SCENES } from './scenes.js';

const GREY = 128;

/** Specks about a middle grey, stretched over the frame: how much lighter or darker each point of it is. */
async function texture(lot: Lot, cells: readonly [number, number], spread: number): Promise<Uint8Array> {
  const [width, height] = cells;
  // Three lots together lie close to a bell.
  const one = () => GREY + (lot() + lot() + lot() - 1.5) * spread;
  const specks = Buffer.from(Uint8Array.from({ length: width * height }, one));
  return sharp(specks, { raw: { width, height, channels: 1 } })
    .resize(POINTS_WIDE, POINTS_HIGH, { fit: 'fill', kernel: 'cubic' })
    .extractChannel(0)
    .raw()
    .toBuffer();
}

const svg = (drawn: string) =>
  Buffer.from(
    `<svg xmlns="http://www.w3.org/2000/svg" width="${POINTS_WIDE}" height="${POINTS_HIGH}" viewBox="0 0 ${WIDE} ${HIGH}">${DEFS}${drawn}</svg>`,
  );

const VIGNETTE = `<radialGradient id="vignette" cx="0.46" cy="0.44" r="0.78"><stop offset="0.5" stop-color="#000" stop-opacity="0"/><stop offset="1" stop-color="#000" stop-opacity="0.5"/></radialGradient><rect width="${WIDE}" height="${HIGH}" fill="url(#vignette)"/>`;

interface Layers {
  readonly behind: Buffer | null;
  readonly ground: Buffer;
  readonly things: Buffer;
  readonly clouds: Uint8Array;
  readonly skin: Uint8Array | null;
  readonly grain: Uint8Array;
}

const rendered = (drawn: string) => sharp(svg(drawn)).ensureAlpha().raw().toBuffer();

/** What is far off is drawn small: enlarging it is the blur. */
async function renderedBehind({ drawn, far }: NonNullable<Picture['behind']>): Promise<Buffer> {
  if (!far) return rendered(drawn);
  const small = await sharp(svg(drawn)).resize(20, 15).png().toBuffer();
  return sharp(small).resize(POINTS_WIDE, POINTS_HIGH, { kernel: 'cubic' }).ensureAlpha().raw().toBuffer();
}

/** Lighter or darker by so much, least where it is black or white already, as film does it. */
const lit = (value: number, by: number) => value + (by * value * (255 - value)) / 16_256;

/** Layer over layer, each under its own light; in one go, as there are a million points. */
function exposed({ behind, ground, things, clouds, skin, grain }: Layers): Uint8ClampedArray {
  const points = POINTS_WIDE * POINTS_HIGH;
  const film = new Uint8ClampedArray(points * 3);
  for (let point = 0; point < points; point += 1) {
    const at = point * 4;
    const metal = ground[at + 3]! / 255;
    const thing = things[at + 3]! / 255;
    const onMetal = clouds[point]! - GREY + (skin ? skin[point]! - GREY : 0);
    const onAll = grain[point]! - GREY;
    for (let ink = 0; ink < 3; ink += 1) {
      const back = behind ? behind[at + ink]! * (1 - metal) : 0;
      const below = back + lit(ground[at + ink]!, onMetal) * metal;
      film[point * 3 + ink] = lit(below * (1 - thing) + things[at + ink]! * thing, onAll);
    }
  }
  return film;
}

export type Draw = (shot: Omit<Shot, 'lot'>) => Promise<Buffer>;

/**
 * Draws pictures of the shop as a phone takes them: to scale, light from the upper left, a little out of true, with
 * grain. The same shot gives the same picture. What takes long is prepared once for all of them.
 */
export async function openDarkroom(): Promise<Draw> {
  const lot = lotsOf('darkroom');
  const grain = await texture(lot, [POINTS_WIDE / 2, POINTS_HIGH / 2], 13);
  const skins: Readonly<Record<Skin, Uint8Array | null>> = {
    brushed: await texture(lot, [14, POINTS_HIGH], 24),
    sprayed: await texture(lot, [320, 240], 11),
    plain: null,
  };
  const skies = await Promise.all([0, 1, 2, 3, 4].map(() => texture(lot, [7, 5], 28)));
  return async ({ photo, card }) => {
    const shot: Shot = { photo, card, lot: lotsOf(photo.key) };
    const scene = SCENES[photo.key];
    if (!scene) throw new Error(`Nobody drew the photo ${photo.key}.`);
    const { behind, ground, things, skin } = scene(shot);
    const clouds = skies[Math.floor(shot.lot() * skies.length)]!;
    const [back, middle, front] = await Promise.all([
      behind ? renderedBehind(behind) : null,
      rendered(ground),
      rendered(`${things}${VIGNETTE}`),
    ]);
    const film = exposed({ behind: back, ground: middle, things: front, clouds, skin: skins[skin], grain });
    // A phone's lens is not as sharp as a drawing.
    return sharp(film, { raw: { width: POINTS_WIDE, height: POINTS_HIGH, channels: 3 } })
      .blur()
      .jpeg({ quality: 86 })
      .toBuffer();
  };
}
