import { readSpectrumFile } from '../../../core/measured/reading/readSpectrumFile';
import { curveRow } from '../../../core/record/curve';
import { storeFile } from '../../../core/record/file';
import type { FileReading, ReadingRequest } from './protocol';

/** Reads the spectra of a file and hashes its bytes and numbers: too long for the window's own thread. */
export function readFile({ bytes, mediaType, choices }: ReadingRequest): FileReading {
  const reading = readSpectrumFile(bytes, choices);
  return {
    reading,
    file: storeFile(bytes, mediaType.slice(0, 100)),
    curves: reading.spectra.map(curveRow),
  };
}
