import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../../../core/errors';
import type { CommandIo } from '../command';
import { readSpectrum } from './readSpectrum';

const notes: string[] = [];
const io: CommandIo = {
  readBytes: (path) => {
    const texts: Record<string, string> = {
      'a.csv': 'Wavelength (nm),A\n400,0.1\n410,Over\n420,0.3\n',
      'b.csv': 'name,colour\nx,blue\n',
      'c.csv': 'nm,batch 3\n400,0.1\n410,0.2\n',
    };
    if (texts[path] === undefined) {
      return Promise.reject(
        new SpinhueError({ code: 'unreadable-file', message: `cannot read ${path}`, field: path }),
      );
    }
    return Promise.resolve(new TextEncoder().encode(texts[path]));
  },
  readText: () => Promise.reject(new Error('not used')),
  readJson: () => Promise.reject(new Error('not used')),
  note: (line) => void notes.push(line),
};

describe('read-spectrum', () => {
  it('prints one entry per file, and a bad or missing file does not stop the others', async () => {
    const answer = await readSpectrum.run(
      { operands: ['a.csv', 'b.csv', 'missing.csv', 'c.csv'], options: new Map() },
      io,
    );
    expect(answer).toEqual([
      {
        file: 'a.csv',
        outcome: 'ok',
        warnings: [expect.stringMatching(/^saturated: /)],
        spectra: [
          {
            name: null,
            kind: 'curve',
            x: [400, 410, 420],
            y: [0.1, null, 0.3],
            xUnit: 'nm',
            yUnit: 'absorbance',
          },
        ],
      },
      {
        file: 'b.csv',
        outcome: 'error',
        warnings: [],
        error: { code: 'no-table', message: expect.any(String) as string },
        spectra: [],
      },
      {
        file: 'missing.csv',
        outcome: 'error',
        warnings: [],
        error: { code: 'unreadable-file', message: 'cannot read missing.csv' },
        spectra: [],
      },
      expect.objectContaining({ file: 'c.csv', outcome: 'ok', warnings: [] }),
    ]);
    expect(notes).toEqual(['c.csv: column 2: the heading does not say what y is; taken as absorbance']);
  });
});
