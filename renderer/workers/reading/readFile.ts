import { readSpectrumFile } from '../../../core/measured/reading/readSpectrumFile';
import { curveRow } from '../../../core/record/curve';
import { storeFile } from '../../../core/record/file';
import type { FileReading, ReadingRequest } from './protocol';

/** Reads the spectra of a file and hashes its bytes and numbers: too long for the window's own thread. */
export function readFile({ bytes, mediaType, choices, units = {} }: ReadingRequest): FileReading {
  const found = readSpectrumFile(bytes, choices);
  const reading = { ...found, spectra: found.spectra.map((spectrum) => ({ ...spectrum, ...units })) };
  return {
    reading,
    file: storeFile(bytes, mediaType.slice(0, 100)),
    curves: reading.spectra.map(curveRow),
  };
}
