const APP0 = 0xe0;
const SOI = Buffer.from([0xff, 0xd8]);
const IDENTIFIER = Buffer.from('JFIF\0', 'latin1');
const PER_INCH = 1;

/**
 * The same JPEG with its density recorded in a JFIF APP0 segment. sharp records it in Exif only, which many print
 * programs do not read. JFIF 1.02 wants APP0 right after the start-of-image marker.
 *
 * @param ppi - pixels per inch, rounded to a whole number, as JFIF stores it.
 * @throws RangeError when the bytes are not a JPEG or the density does not fit 16 bits.
 */
export function withJfifDensity(jpeg: Buffer, ppi: number): Buffer {
  if (!jpeg.subarray(0, 2).equals(SOI)) throw new RangeError('Not a JPEG');
  const density = Math.round(ppi);
  if (!(density >= 1 && density <= 0xffff)) throw new RangeError(`Not a JFIF density: ${ppi}`);
  const rest = jpeg.subarray(startsWithJfif(jpeg) ? 4 + jpeg.readUInt16BE(4) : 2);
  return Buffer.concat([SOI, jfifSegment(density), rest]);
}

const startsWithJfif = (jpeg: Buffer): boolean =>
  jpeg[2] === 0xff && jpeg[3] === APP0 && jpeg.subarray(6, 11).equals(IDENTIFIER);

function jfifSegment(density: number): Buffer {
  const segment = Buffer.alloc(18);
  segment.writeUInt16BE(0xff00 | APP0, 0);
  segment.writeUInt16BE(16, 2); // length of what follows, itself included
  IDENTIFIER.copy(segment, 4);
  segment.writeUInt16BE(0x0102, 9); // version 1.02
  segment.writeUInt8(PER_INCH, 11);
  segment.writeUInt16BE(density, 12);
  segment.writeUInt16BE(density, 14);
  return segment; // no thumbnail: the last two bytes stay 0
}
