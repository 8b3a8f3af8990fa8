import { basename } from 'node:path';
import { SpinhueError } from '../../../core/errors';
import { readSpectrumFile } from '../../../core/measured/reading/readSpectrumFile';
import type { SpectrumReading } from '../../../core/measured/reading/types';
import type { Command, CommandIo } from '../command';

interface Printed {
  file: string;
  outcome: SpectrumReading['outcome'];
  warnings: string[];
  error?: { code: string; message: string };
  spectra: Pick<SpectrumReading['spectra'][number], 'name' | 'kind' | 'x' | 'y' | 'xUnit' | 'yUnit'>[];
}

async function readOne(file: string, io: CommandIo): Promise<Printed> {
  let bytes: Uint8Array;
  try {
    bytes = await io.readBytes(file);
  } catch (error) {
    if (!(error instanceof SpinhueError)) throw error;
    return {
      file,
      outcome: 'error',
      warnings: [],
      error: { code: error.code, message: error.message },
      spectra: [],
    };
  }
  const reading = readSpectrumFile(bytes);
  for (const assumption of reading.assumptions ?? []) io.note(`${basename(file)}: ${assumption}`);
  return {
    file,
    outcome: reading.outcome,
    warnings: reading.warnings.map((warning) => `${warning.code}: ${warning.message}`),
    ...(reading.error === undefined ? {} : { error: reading.error }),
    spectra: reading.spectra.map(({ name, kind, x, y, xUnit, yUnit }) => ({
      name,
      kind,
      x,
      y,
      xUnit,
      yUnit,
    })),
  };
}

export const readSpectrum: Command = {
  name: 'read-spectrum',
  usage: 'FILE...',
  summary: 'read JCAMP-DX or delimited text; one bad file does not stop the others',
  options: {},
  operands: { min: 1, max: 10_000 },
  async run(args, io) {
    const results: Printed[] = [];
    for (const file of args.operands) results.push(await readOne(file, io));
    return results;
  },
};
