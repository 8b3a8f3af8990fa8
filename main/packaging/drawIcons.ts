import { readFile, writeFile } from 'node:fs/promises';
import { resolve } from 'node:path';
import { chromium } from '@playwright/test';

/** Draws `assets/public/icon.svg` at every size a system asks for; to be run by hand after the drawing changed. */

const folder = resolve(import.meta.dirname, '../../assets/icon');
const sizes = [16, 32, 48, 64, 128, 256, 512] as const;

/** Windows: a directory of pictures, each a whole PNG. */
function ico(pictures: readonly { size: number; png: Buffer }[]): Buffer {
  const head = Buffer.alloc(6 + 16 * pictures.length);
  head.writeUInt16LE(1, 2);
  head.writeUInt16LE(pictures.length, 4);
  let offset = head.length;
  pictures.forEach(({ size, png }, i) => {
    const at = 6 + 16 * i;
    // 0 stands for 256.
    head.writeUInt8(size % 256, at);
    head.writeUInt8(size % 256, at + 1);
    head.writeUInt16LE(1, at + 4);
    head.writeUInt16LE(32, at + 6);
    head.writeUInt32LE(png.length, at + 8);
    head.writeUInt32LE(offset, at + 12);
    offset += png.length;
  });
  return Buffer.concat([head, ...pictures.map(({ png }) => png)]);
}

/** Apple: blocks of type, length and PNG. */
function icns(pictures: readonly { size: number; png: Buffer }[]): Buffer {
  const types: Record<number, string> = { 128: 'ic07', 256: 'ic08', 512: 'ic09' };
  const block = (type: string, body: Buffer): Buffer => {
    const head = Buffer.alloc(8);
    head.write(type, 0, 'latin1');
    head.writeUInt32BE(body.length + 8, 4);
    return Buffer.concat([head, body]);
  };
  const blocks = pictures.flatMap(({ size, png }) => (types[size] ? [block(types[size], png)] : []));
  return block('icns', Buffer.concat(blocks));
}

const svg = await readFile(resolve(folder, '../public/icon.svg'), 'utf8');
const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
});
const pictures = [];
for (const size of sizes) {
  const page = await browser.newPage({ viewport: { width: size, height: size } });
  await page.setContent(
    `<style>body{margin:0}svg{display:block;width:${size}px;height:${size}px}</style>${svg}`,
  );
  pictures.push({ size, png: await page.screenshot({ omitBackground: true }) });
  await page.close();
}
await browser.close();
await writeFile(resolve(folder, 'icon.png'), pictures.at(-1)!.png);
await writeFile(resolve(folder, 'icon.ico'), ico(pictures.filter(({ size }) => size <= 256)));
await writeFile(resolve(folder, 'icon.icns'), icns(pictures));
await writeFile(resolve(folder, 'drag.png'), pictures.find(({ size }) => size === 64)!.png);
