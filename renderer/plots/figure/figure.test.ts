import { crc32 as nodeCrc32, deflateSync, inflateSync } from 'node:zlib';
import { afterEach, describe, expect, it } from 'vitest';
import { crc32, withDensity } from './pngDensity';
import { fileStem } from './SaveFigure';
import { plainColour, standaloneSvg, svgFileText } from './standaloneSvg';

const bytes = (text: string) => new TextEncoder().encode(text);

/** A PNG of one black pixel, chunk by chunk as the specification sets out. */
function onePixel(): Uint8Array {
  const chunk = (type: string, data: Uint8Array): Uint8Array => {
    const body = Uint8Array.from([...bytes(type), ...data]);
    const result = new Uint8Array(8 + body.length);
    const view = new DataView(result.buffer);
    view.setUint32(0, data.length);
    result.set(body, 4);
    view.setUint32(4 + body.length, crc32(body));
    return result;
  };
  const header = Uint8Array.from([0, 0, 0, 1, 0, 0, 0, 1, 8, 0, 0, 0, 0]);
  return Uint8Array.from([
    ...[0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a],
    ...chunk('IHDR', header),
    ...chunk('IDAT', deflateSync(Uint8Array.from([0, 0]))),
    ...chunk('IEND', new Uint8Array()),
  ]);
}

describe('a picture at 300 dpi', () => {
  it('has the checksum of ISO 3309: 0xCBF43926 for "123456789", the usual check value', () => {
    expect(crc32(bytes('123456789'))).toBe(0xcbf43926);
  });

  it('says 11 811 pixels per metre right after the header and keeps every other chunk', () => {
    const png = withDensity(onePixel(), 300);
    const view = new DataView(png.buffer);
    expect(new TextDecoder().decode(png.subarray(37, 41))).toBe('pHYs');
    expect([view.getUint32(33), view.getUint32(41), view.getUint32(45), png[49]]).toEqual([
      9, 11_811, 11_811, 1,
    ]);
    expect(new TextDecoder().decode(png.subarray(58, 62))).toBe('IDAT');
    expect(inflateSync(png.subarray(62, 62 + view.getUint32(54)))).toHaveLength(2);
    const type = png.subarray(37, 50);
    if (nodeCrc32) expect(view.getUint32(50)).toBe(nodeCrc32(type));
  });
});

describe('a figure that stands alone', () => {
  afterEach(() => document.body.replaceChildren());

  it('carries its styles, its title and its legend, and needs no style sheet', () => {
    document.body.innerHTML =
      '<style>.a { stroke: rgb(1, 2, 3); }</style><svg id="d"><path class="a" d="M0 0H9"/></svg><svg id="s"><path class="a"/></svg>';
    const svg = standaloneSvg({
      title: 'Levels of d6',
      drawing: document.querySelector<SVGSVGElement>('#d')!,
      width: 600,
      height: 300,
      legend: [{ text: 'quintets', sample: null }],
      samples: [document.querySelector<SVGSVGElement>('#s')!],
    });
    const text = svgFileText(svg);
    expect(text).toMatch(/^<\?xml version="1.0"/);
    expect(text).toContain('Levels of d6');
    expect(text).toContain('quintets');
    expect(text).not.toContain('class=');
    expect(svg.querySelector('path')!.getAttribute('stroke')).toBe('rgb(1, 2, 3)');
    expect(Number(svg.getAttribute('height'))).toBeGreaterThan(330);
    expect(document.querySelector('.plot-on-paper')).toBeNull();
  });

  it('writes mixed colours so that drawing programs read them', () => {
    expect(plainColour('color(srgb 0.5 0 1)')).toBe('rgb(128, 0, 255)');
    expect(plainColour('color(srgb 1 1 1 / 0.25)')).toBe('rgba(255, 255, 255, 0.25)');
    expect(plainColour('rgb(1, 2, 3)')).toBe('rgb(1, 2, 3)');
  });

  it('has a file name that every system takes', () => {
    expect(fileStem('Levels: 10Dq/B of [Cr(en)3]3+')).toBe('Levels-10Dq-B-of-Cr-en-3-3+');
    expect(fileStem('…')).toBe('figure');
  });
});
