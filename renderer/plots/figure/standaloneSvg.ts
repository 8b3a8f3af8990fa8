import { type LegendEntry } from '../frame/Legend';

const svgNamespace = 'http://www.w3.org/2000/svg';

/** What a drawing takes from style sheets and must carry with it once it stands alone. */
const carried = [
  'fill',
  'fill-opacity',
  'stroke',
  'stroke-width',
  'stroke-dasharray',
  'stroke-linecap',
  'stroke-opacity',
  'opacity',
  'font-family',
  'font-size',
  'font-weight',
  'font-style',
  'text-anchor',
  'paint-order',
  'visibility',
];

/** Mixed colours are computed as `color(srgb …)`, which few drawing programs read. */
export const plainColour = (value: string): string =>
  value.replace(
    /color\(srgb ([\d.e-]+) ([\d.e-]+) ([\d.e-]+)(?: \/ ([\d.e-]+))?\)/g,
    (_, ...parts: string[]) => {
      const [red, green, blue] = parts.slice(0, 3).map((part) => Math.round(255 * Number(part)));
      const alpha = parts[3];
      return alpha === undefined
        ? `rgb(${red}, ${green}, ${blue})`
        : `rgba(${red}, ${green}, ${blue}, ${Number(alpha)})`;
    },
  );

function carryStyles(live: Element, copy: Element): void {
  const style = getComputedStyle(live);
  for (const name of carried) {
    const value = style.getPropertyValue(name);
    if (value !== '') copy.setAttribute(name, plainColour(value));
  }
  copy.removeAttribute('class');
  copy.removeAttribute('style');
  Array.from(live.children).forEach((child, index) => carryStyles(child, copy.children[index]!));
}

function svgText(words: string, x: number, y: number, size: number, weight = '400'): SVGTextElement {
  const text = document.createElementNS(svgNamespace, 'text');
  for (const [name, value] of Object.entries({ x, y, 'font-size': size, 'font-weight': weight })) {
    text.setAttribute(name, String(value));
  }
  text.textContent = words;
  return text;
}

interface FigureParts {
  readonly title: string;
  /** Drawing on the page. */
  readonly drawing: SVGSVGElement;
  readonly width: number;
  readonly height: number;
  readonly legend: readonly LegendEntry[];
  /** Legend samples on the page, in the same order. */
  readonly samples: readonly SVGSVGElement[];
}

/**
 * The figure as a file of its own: title, drawing and legend on white, in the colours of print whatever the theme,
 * with nothing left to a style sheet.
 */
export function standaloneSvg({
  title,
  drawing,
  width,
  height,
  legend,
  samples,
}: FigureParts): SVGSVGElement {
  const stage = document.createElement('div');
  stage.className = 'plot plot-on-paper';
  document.body.append(stage);
  try {
    const copies = [drawing, ...samples].map((live) => {
      const staged = live.cloneNode(true) as SVGSVGElement;
      stage.append(staged);
      const copy = staged.cloneNode(true) as SVGSVGElement;
      carryStyles(staged, copy);
      return copy;
    });
    const head = 30;
    const columns = Math.max(1, Math.floor(width / 220));
    const rows = Math.ceil(legend.length / columns);
    const whole = document.createElementNS(svgNamespace, 'svg');
    const total = head + height + rows * 20 + (rows > 0 ? 10 : 0);
    whole.setAttribute('xmlns', svgNamespace);
    whole.setAttribute('width', String(width));
    whole.setAttribute('height', String(total));
    whole.setAttribute('viewBox', `0 0 ${width} ${total}`);
    whole.setAttribute('font-family', getComputedStyle(stage).fontFamily || 'sans-serif');
    whole.setAttribute('fill', '#000000');
    const paper = document.createElementNS(svgNamespace, 'rect');
    paper.setAttribute('width', String(width));
    paper.setAttribute('height', String(total));
    paper.setAttribute('fill', '#ffffff');
    const placed = (node: SVGElement, x: number, y: number): SVGElement => {
      node.setAttribute('x', String(x));
      node.setAttribute('y', String(y));
      return node;
    };
    const name = document.createElementNS(svgNamespace, 'title');
    name.textContent = title;
    whole.append(name, paper, svgText(title, 12, 20, 15, '600'), placed(copies[0]!, 0, head));
    legend.forEach(({ text }, index) => {
      const [x, y] = [16 + (index % columns) * 220, head + height + 4 + Math.floor(index / columns) * 20];
      const sample = copies[index + 1];
      if (sample) whole.append(placed(sample, x, y));
      whole.append(svgText(text, x + 40, y + 11, 12));
    });
    return whole;
  } finally {
    stage.remove();
  }
}

export const svgFileText = (svg: SVGSVGElement): string =>
  `<?xml version="1.0" encoding="UTF-8"?>\n${new XMLSerializer().serializeToString(svg)}\n`;
