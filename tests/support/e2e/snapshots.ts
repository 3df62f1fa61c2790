import sharp from 'sharp';

export interface Snapshot {
  readonly name: string;
  readonly mimeType: 'image/jpeg';
  readonly buffer: Buffer;
}

/** Colours of a scene's sky, hills and meadow, so far apart that each picture has a palette of its own. */
const SCENES = [
  ['harbour wall', '#7fb2d9', '#24506b', '#d8b26a'],
  ['beech wood', '#dfe8c8', '#3d5a2b', '#b5682e'],
  ['market stall', '#f2e3c4', '#a83a2c', '#3f6f4e'],
  ['first snow', '#c9d4e2', '#54607a', '#f4f6f9'],
  ['poppy field', '#a9cdea', '#5f7d3a', '#c4302b'],
  ['lamp room', '#2c3553', '#151b2e', '#e9b949'],
  ['low tide', '#e8c9b0', '#6d8f95', '#c7a27c'],
  ['heather hill', '#d9dcef', '#7a5487', '#56713f'],
] as const;

/**
 * Eight pictures that a camera could have taken, with detail everywhere, grain, and EXIF that says where and with what;
 * the second was taken with the camera on its side. 3:2, so that they are taken for 6 × 4 in prints.
 */
export const eightSnapshots = (): Promise<Snapshot[]> => Promise.all(SCENES.map((_, at) => snapshot(at)));

export async function snapshot(at: number): Promise<Snapshot> {
  const [name, sky, hill, meadow] = SCENES[at % SCENES.length]!;
  const isOnItsSide = at === 1;
  const drawing = Buffer.from(scene({ sky, hill, meadow, seed: at + 1 }));
  const grain = { create: { width: WIDTH, height: HEIGHT, channels: 3 as const, noise: { type: 'gaussian' as const, mean: 128, sigma: 8 }, background: '#808080' } };
  let picture = sharp(drawing).composite([{ input: await sharp(grain).png().toBuffer(), blend: 'soft-light' }]).removeAlpha();
  // What a camera on its side stores: the picture turned back, and a mark that says how to turn it upright again.
  if (isOnItsSide) picture = sharp(await picture.png().toBuffer()).rotate(270);
  const buffer = await picture
    .withMetadata({ orientation: isOnItsSide ? 6 : 1 })
    .withExifMerge({
      IFD0: { Make: 'Lantern', Model: 'Lantern 3', Software: 'from memory' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '54/1 30/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '1/1 10/1 0/1' },
    })
    .jpeg({ quality: 90 })
    .toBuffer();
  // From the ninth on the names come round again.
  const round = Math.floor(at / SCENES.length);
  return { name: `${round === 0 ? name : `${name} ${round + 1}`}.jpg`, mimeType: 'image/jpeg', buffer };
}

const WIDTH = 1500;
const HEIGHT = 1000;

interface SceneColors {
  readonly sky: string;
  readonly hill: string;
  readonly meadow: string;
  readonly seed: number;
}

/** Sky, sun, hills, a fence across the middle and stones in front. */
function scene({ sky, hill, meadow, seed }: SceneColors): string {
  // The usual hash of shader programs: 0 to 1, scattered, the same in every run.
  const random = (i: number): number => {
    const scattered = Math.sin(i * 12.9898 + seed * 78.233) * 43_758.5453;
    return scattered - Math.floor(scattered);
  };
  const posts = Array.from({ length: 17 }, (_, i) => `<rect x="${i * 92 + random(i) * 20}" y="${520 + random(i + 40) * 40}" width="${14 + random(i + 9) * 16}" height="190" fill="#241d18"/>`);
  const stones = Array.from({ length: 60 }, (_, i) => {
    const light = 40 + Math.round(random(i + 3) * 55);
    return `<ellipse cx="${random(i) * WIDTH}" cy="${690 + random(i + 77) * 310}" rx="${12 + random(i + 5) * 46}" ry="${8 + random(i + 6) * 24}" fill="hsl(${random(i + 8) * 360} 18% ${light}%)"/>`;
  });
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}">
    <linearGradient id="sky" x2="0" y2="1"><stop stop-color="${sky}"/><stop offset="1" stop-color="#fff7ea"/></linearGradient>
    <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#sky)"/>
    <circle cx="${240 + seed * 120}" cy="${140 + random(2) * 120}" r="70" fill="#fff3c9"/>
    <path d="M0 ${430 + random(1) * 90}L${200 + random(4) * 200} ${250 + random(5) * 120}L${620 + random(6) * 120} 500L${960 + random(7) * 160} ${260 + random(8) * 140}L${WIDTH} 520V${HEIGHT}H0Z" fill="${hill}"/>
    <path d="M0 640Q${WIDTH / 3} ${560 + random(11) * 60} ${WIDTH} 660V${HEIGHT}H0Z" fill="${meadow}"/>
    ${posts.join('')}<rect y="590" width="${WIDTH}" height="16" fill="#33291f"/>${stones.join('')}
  </svg>`;
}
