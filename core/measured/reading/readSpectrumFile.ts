import { readDelimited, type DelimitedChoices } from '../delimited/read';
import { isJcamp, readJcamp } from '../jcamp/read';
import { decodeText } from './encoding';
import { ReadingError, type SpectrumReading } from './types';

/**
 * Reads the bytes of a spectrum file, JCAMP-DX or a table of delimited text, told apart by what the text looks like and
 * not by the name of the file. Never throws for bad input: the outcome says what is wrong.
 */
export function readSpectrumFile(bytes: Uint8Array, choices: DelimitedChoices = {}): SpectrumReading {
  try {
    const decoded = decodeText(bytes);
    const reading = isJcamp(decoded.text)
      ? { ...readJcamp(decoded.text), layout: { encoding: decoded.encoding, eol: decoded.eol } }
      : readDelimited(decoded, choices);
    if (decoded.encoding !== 'windows-1252' || reading.outcome === 'error') return reading;
    const message = 'the text is not UTF-8; letters beyond ASCII are read as Windows-1252';
    return { ...reading, warnings: [...reading.warnings, { code: 'encoding', message }] };
  } catch (error) {
    if (!(error instanceof ReadingError)) throw error;
    return {
      format: 'unknown',
      outcome: 'error',
      warnings: [],
      error: { code: error.code, message: error.message },
      spectra: [],
    };
  }
}
