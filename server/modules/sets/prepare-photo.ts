import sharp from 'sharp';
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

/**
 * Reads a photograph by its bytes, whatever its name says, turns it upright, resizes it to fit 2,000 and 480 pixels
 * and writes JPEGs without any metadata: neither position nor camera survives.
 * Throws `unusable-photo` naming the file and what would do.
 */
export async function preparePhoto(bytes: Buffer, fileName: string): Promise<PreparedPhoto> {
  const refuse = (why: string) =>
    new ProblemError('unusable-photo', {
      detail: `«${fileName.slice(0, 80)}» ${why} Use a JPEG, PNG, WebP, TIFF or HEIF photograph of up to 25 MB.`,
    });
  const open = () => sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error' });
  const { format, width, height } = await describe();
  if (!FORMATS.has(format)) throw refuse(`is a ${format} file.`);
  if (Math.min(width, height) < LEAST) throw refuse(`is only ${width} × ${height} pixels.`);
  if (width * height > MOST_PIXELS)
    throw refuse(`has ${Math.round((width * height) / 1e6)} megapixels; 100 is the most.`);

  const upright = () => open().autoOrient().flatten({ background: '#ffffff' }).toColourspace('srgb');
  const fit = (side: number) => ({ width: side, height: side, fit: 'inside', withoutEnlargement: true }) as const;
  try {
    const [large, small] = await Promise.all([
      upright().resize(fit(LARGE)).jpeg({ quality: 85, mozjpeg: true }).toBuffer({ resolveWithObject: true }),
      upright().resize(fit(SMALL)).jpeg({ quality: 80, mozjpeg: true }).toBuffer(),
    ]);
    return { large: large.data, small, width: large.info.width, height: large.info.height };
  } catch {
    throw refuse('is damaged: its picture ends early or cannot be decoded.');
  }

  async function describe() {
    try {
      return await open().metadata();
    } catch {
      throw refuse('is not a picture that can be read.');
    }
  }
}
