const crcTable = Uint32Array.from({ length: 256 }, (_, byte) => {
  let value = byte;
  for (let bit = 0; bit < 8; bit++) value = value & 1 ? 0xedb88320 ^ (value >>> 1) : value >>> 1;
  return value >>> 0;
});

/** CRC-32 of ISO 3309, as PNG chunks need it. */
export function crc32(bytes: Uint8Array): number {
  let crc = 0xffffffff;
  for (const byte of bytes) crc = crcTable[(crc ^ byte) & 0xff]! ^ (crc >>> 8);
  return (crc ^ 0xffffffff) >>> 0;
}

const signatureAndHeader = 8 + 25;

/**
 * Adds the physical pixel size to a PNG (chunk `pHYs`, PNG specification, third edition, 11.3.4.3) so that it is placed
 * at its true size. A canvas writes none.
 */
export function withDensity(png: Uint8Array, dotsPerInch: number): Uint8Array<ArrayBuffer> {
  const perMetre = Math.round(dotsPerInch / 0.0254);
  const chunk = new Uint8Array(4 + 4 + 9 + 4);
  const view = new DataView(chunk.buffer);
  view.setUint32(0, 9);
  chunk.set([0x70, 0x48, 0x59, 0x73], 4);
  view.setUint32(8, perMetre);
  view.setUint32(12, perMetre);
  chunk[16] = 1;
  view.setUint32(17, crc32(chunk.subarray(4, 17)));
  const result = new Uint8Array(png.length + chunk.length);
  result.set(png.subarray(0, signatureAndHeader));
  result.set(chunk, signatureAndHeader);
  result.set(png.subarray(signatureAndHeader), signatureAndHeader + chunk.length);
  return result;
}
