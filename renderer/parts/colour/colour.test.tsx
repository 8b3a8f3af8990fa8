import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { type SeenColour } from '../../../core/colour/types';
import { CloudStrip } from './CloudStrip';
import { sortedByHue } from './colourNumbers';
import { passedInWords, passedRanges } from './passedRanges';
import { Swatch } from './Swatch';
import { SwatchTrio } from './SwatchTrio';
import { TransmissionStrip } from './TransmissionStrip';

afterEach(cleanup);

const seen = (srgb: string, lab: [number, number, number], words: string, inGamut = true): SeenColour => ({
  ...{ srgb, lab, words, inGamut },
  XYZ: [0, 0, 0],
  illuminant: 'D65',
  observer: 'CIE 1931 2°',
});
const violet = seen('#7a4fb0', [42, 38, -45], 'violet');
/** 81 samples, 5 nm apart. */
const strip = (passes: (nm: number) => number) =>
  Array.from({ length: 81 }, (_, index) => passes(380 + 5 * index));

describe('a swatch', () => {
  it('stands beside its words, L*a*b* and hex', () => {
    render(<Swatch colour={violet} />);
    expect(screen.getByText('violet')).toBeTruthy();
    expect(screen.getByText('L* 42 a* 38 b* −45')).toBeTruthy();
    expect(screen.getByText('#7a4fb0')).toBeTruthy();
  });

  it('carries the whole text as its name where it stands alone', () => {
    render(<Swatch colour={violet} text="none" size="row" />);
    expect(screen.getByRole('img', { name: /violet, L\* 42/ })).toBeTruthy();
  });

  it('warns where the screen cannot show the colour', () => {
    render(<Swatch colour={seen('#00ffff', [91, -60, -20], 'turquoise', false)} />);
    expect(screen.getByText(/beyond this screen/)).toBeTruthy();
  });

  it('does not invent a colour that was not estimated', () => {
    render(<Swatch colour={null} />);
    expect(screen.getByRole('img', { name: 'colour not estimated' })).toBeTruthy();
  });
});

describe('three strengths', () => {
  it('name each strength, its concentration and the viewing conditions', () => {
    render(
      <SwatchTrio
        strengths={[1 / 3, 1, 3].map((factor) => ({ factor, colour: violet }))}
        concentration_mM={10}
        path_cm={1}
      />,
    );
    expect(screen.getByText('⅓ × · 3.3 mM')).toBeTruthy();
    expect(screen.getAllByRole('img')).toHaveLength(3);
    expect(screen.getByText(/1 cm path, D65/)).toBeTruthy();
  });

  it('write the observer out', () => {
    const colour = { ...violet, observer: '2deg' };
    render(<SwatchTrio strengths={[{ factor: 1, colour }]} concentration_mM={10} path_cm={1} />);
    expect(screen.getByText('Transmitted light, 1 cm path, D65, CIE 1931, 2 degrees')).toBeTruthy();
  });

  it('say so where there is nothing to show', () => {
    render(<SwatchTrio strengths={[]} concentration_mM={10} path_cm={1} />);
    expect(screen.getByText('No colour could be estimated.')).toBeTruthy();
  });
});

describe('the transmission strip', () => {
  it('names the ranges that pass', () => {
    expect(passedInWords(strip((nm) => (nm >= 600 ? 0.9 : 0.02)))).toBe('passes 600–780 nm');
    expect(passedInWords(strip((nm) => (nm > 500 && nm < 600 ? 0.1 : 0.8)))).toBe(
      'passes 380–500 and 600–780 nm',
    );
  });

  it('places the half-way point between samples', () => {
    expect(passedRanges([0, 1])[0]![0]).toBeCloseTo(580, 6);
  });

  it('finds words for all, little and nothing', () => {
    expect(passedInWords(strip(() => 0.97))).toBe('passes the whole visible range');
    expect(passedInWords(strip((nm) => (nm === 520 ? 0.7 : 0.98)))).toMatch(/least \(70 %\) near 520 nm/);
    expect(passedInWords(strip((nm) => (nm === 480 ? 0.3 : 0.05)))).toMatch(/most \(30 %\) near 480 nm/);
    expect(passedInWords(strip(() => 0.001))).toMatch(/almost nothing/);
    expect(passedInWords(strip((nm) => (nm === 520 ? 0.55 : 0)))).toMatch(
      /only a few nanometres near 520 nm/,
    );
    expect(passedInWords([])).toBe('not estimated');
  });

  it('is an image with those words, and one clipped box inside', () => {
    render(<TransmissionStrip transmittance={strip((nm) => (nm > 600 ? 1 : 0))} />);
    const image = screen.getByRole('img', { name: /passes 600–780 nm/ });
    expect(image.querySelectorAll('*')).toHaveLength(1);
  });

  it('reads out the share under the pointer on its large form', () => {
    render(<TransmissionStrip scale transmittance={strip(() => 0.4)} />);
    const image = screen.getByRole('img');
    image.getBoundingClientRect = () => ({ left: 0, width: 400 }) as DOMRect;
    fireEvent.pointerMove(image, { clientX: 120 });
    expect(screen.getByText('500 nm: 40 % passes')).toBeTruthy();
    fireEvent.pointerLeave(image);
    expect(screen.queryByText(/500 nm/)).toBeNull();
  });

  it('says where there is no spectrum', () => {
    render(<TransmissionStrip transmittance={null} />);
    expect(screen.getByText('no spectrum')).toBeTruthy();
  });
});

describe('the cloud strip', () => {
  const green = seen('#2f8f4f', [52, -40, 25], 'green');
  const grey = seen('#777777', [50, 0.4, -0.2], 'grey');

  it('sorts by hue with greys last', () => {
    expect(sortedByHue([grey, violet, green]).map(({ words }) => words)).toEqual(['green', 'violet', 'grey']);
  });

  it('draws each colour once and says how often each name occurs', () => {
    const draws = [violet, violet, green, grey];
    const words = [
      { words: 'violet', share: 0.5 },
      { words: 'green', share: 0.25 },
      { words: 'grey', share: 0.25 },
    ];
    render(<CloudStrip cloud={{ draws, words }} />);
    expect(document.querySelectorAll('rect')).toHaveLength(4);
    expect(screen.getByRole('img', { name: /4 possible colours: violet 50/ })).toBeTruthy();
  });

  it('shows every fifth of 200 colours in a table row, and still counts them all', () => {
    const draws = Array.from({ length: 200 }, () => violet);
    render(<CloudStrip compact cloud={{ draws, words: [{ words: 'violet', share: 1 }] }} />);
    expect(document.querySelectorAll('rect')).toHaveLength(40);
    expect(screen.getByRole('img', { name: /200 possible colours: violet 100/ })).toBeTruthy();
  });

  it('says where nothing was drawn', () => {
    render(<CloudStrip cloud={null} />);
    expect(screen.getByText('no range of colours estimated')).toBeTruthy();
  });
});
