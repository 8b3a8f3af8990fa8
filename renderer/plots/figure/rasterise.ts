import { withDensity } from './pngDensity';

/** CSS pixels per inch, by definition. */
const cssPixelsPerInch = 96;

/** Draws an SVG text into a PNG at `dotsPerInch` of its natural size. Needs `blob:` among the image sources of the page. */
export async function rasterise(
  svgText: string,
  width: number,
  height: number,
  dotsPerInch = 300,
): Promise<Blob> {
  const address = URL.createObjectURL(new Blob([svgText], { type: 'image/svg+xml' }));
  try {
    const image = new Image();
    image.src = address;
    await image.decode();
    const scale = dotsPerInch / cssPixelsPerInch;
    const canvas = document.createElement('canvas');
    canvas.width = Math.round(width * scale);
    canvas.height = Math.round(height * scale);
    canvas.getContext('2d')!.drawImage(image, 0, 0, canvas.width, canvas.height);
    const blob = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/png'));
    if (!blob) throw new Error('The figure is too large to be drawn as a picture; export it as SVG.');
    const bytes = withDensity(new Uint8Array(await blob.arrayBuffer()), dotsPerInch);
    return new Blob([bytes], { type: 'image/png' });
  } finally {
    URL.revokeObjectURL(address);
  }
}
