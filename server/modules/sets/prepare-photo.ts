import sharp, { type Metadata } from 'sharp';
import { ProblemError } from '../../http/problem';

export interface PreparedPhoto {
  readonly large: Buffer;
  readonly small: Buffer;
  /** Of the large picture, in pixels. */
  readonly width: number;
  readonly height: number;
}

const LARGE = 2000;
const SMALL = 480;
const LEAST = 32;
/** 100 megapixels: more than cameras of the trade take, less than what fills the memory. */
const MOST_PIXELS = 100_000_000;
const FORMATS = new Set(['jpeg', 'png', 'webp', 'tiff', 'heif']);

/** The picture before this one; a decoded picture can take 300 MB, so they are prepared one after the other. */
let before: Promise<unknown> = Promise.resolve();

/**
 * Reads a photograph by its bytes, whatever its name says, turns it upright, resizes it to fit 2,000 and 480 pixels
 * and writes JPEGs without any metadata: neither position nor camera survives.
 * Throws `unusable-photo` naming the file and what would do.
 */
export function preparePhoto(bytes: Buffer, fileName: string): Promise<PreparedPhoto> {
  const prepared = before.then(() => prepare(bytes, fileName));
  before = prepared.then(
    () => undefined,
    () => undefined, // the one who sent it is told; the next picture is not concerned
  );
  return prepared;
}

async function prepare(bytes: Buffer, fileName: string): Promise<PreparedPhoto> {
  const refuse = (why: string) =>
    new ProblemError('unusable-photo', {
      detail: `«${fileName.slice(0, 80)}» ${why} Use a JPEG, PNG, WebP, TIFF or AVIF photograph of up to 25 MB.`,
    });

  let told: Metadata;
  try {
    // only the header is read here: what is too large is named as such below
    told = await sharp(bytes, { limitInputPixels: false }).metadata();
  } catch {
    throw refuse(
      isHeic(bytes)
        ? 'is a HEIC photograph, which cannot be read here; export it as JPEG.'
        : 'is not a picture that can be read.',
    );
  }
  const { format, width, height, compression } = told;
  if (!FORMATS.has(format)) throw refuse(`is a ${format.toUpperCase()} file.`);
  if (format === 'heif' && compression !== 'av1')
    throw refuse('is a HEIC photograph, which cannot be read here; export it as JPEG.');
  if (Math.min(width, height) < LEAST) throw refuse(`is only ${width} × ${height} pixels.`);
  if (width * height > MOST_PIXELS)
    throw refuse(`has ${Math.ceil((width * height) / 1e6)} megapixels; 100 is the most.`);

  try {
    const large = await sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error' })
      .autoOrient()
      .flatten({ background: '#ffffff' })
      .toColourspace('srgb')
      .resize(within(LARGE))
      .jpeg({ quality: 85, mozjpeg: true })
      .toBuffer({ resolveWithObject: true });
    const small = await sharp(large.data).resize(within(SMALL)).jpeg({ quality: 80, mozjpeg: true }).toBuffer();
    return { large: large.data, small, width: large.info.width, height: large.info.height };
  } catch {
    throw refuse('is damaged: its picture ends early or cannot be decoded.');
  }
}

const within = (side: number) => ({ width: side, height: side, fit: 'inside', withoutEnlargement: true }) as const;

/** ISO base media files name their brands in a leading `ftyp` box; those of HEVC pictures begin so. */
const isHeic = (bytes: Buffer): boolean =>
  /^ftyp(?:heic|heix|hevc|hevx|heim|heis)/.test(bytes.toString('latin1', 4, 12));
