import type { CurveData } from '../../record/curve';

/** One spectrum of a file, x ascending; y is null where a point is saturated or missing. */
export interface ReadSpectrum extends CurveData {
  readonly name: string | null;
  /** Direction of x in the file. */
  readonly fileOrder: 'ascending' | 'descending';
  /** Labels and header lines as they stand in the file. */
  readonly metadata: Readonly<Record<string, string>>;
}

export type ReadingErrorCode =
  | 'empty'
  | 'binary'
  | 'too-large'
  | 'no-table'
  | 'too-few-points'
  | 'not-monotonic'
  | 'structure'
  | 'missing-label'
  | 'duplicate-label'
  | 'bad-number'
  | 'bad-character'
  | 'x-check'
  | 'y-check'
  | 'point-count'
  | 'repeat-count'
  | 'truncated'
  | 'wrong-kind'
  | 'not-supported';

export type ReadingWarningCode =
  | 'saturated'
  | 'missing'
  | 'duplicate-x'
  | 'footer'
  | 'skipped-lines'
  | 'skipped-block'
  | 'units'
  | 'encoding'
  | 'no-end'
  | 'recovered'
  | 'check-value'
  | 'rejoined'
  | 'thousands'
  | 'plausibility';

export interface ReadingWarning {
  readonly code: ReadingWarningCode;
  /** A sentence for a person. */
  readonly message: string;
}

/** How the text was laid out, for the preview that the user may correct. */
export interface TextLayout {
  readonly encoding: 'utf-8' | 'utf-8-bom' | 'utf-16le' | 'utf-16be' | 'windows-1252';
  readonly eol: 'LF' | 'CRLF' | 'CR' | 'mixed';
  readonly delimiter?: ',' | ';' | '\t' | 'whitespace';
  readonly decimal?: '.' | ',';
}

/**
 * What came out of a file. `ok`: everything was read as it stands, remarks may be attached. `warning`: the file breaks
 * a rule of its format and was read all the same, look before accepting. `ask`: the user must choose before the numbers
 * mean anything. `error`: refused, no spectra.
 */
export interface SpectrumReading {
  readonly format: 'jcamp-dx' | 'delimited' | 'unknown';
  readonly outcome: 'ok' | 'warning' | 'ask' | 'error';
  readonly warnings: readonly ReadingWarning[];
  readonly error?: { readonly code: ReadingErrorCode; readonly message: string };
  readonly spectra: readonly ReadSpectrum[];
  readonly layout?: TextLayout;
  /** What was taken for granted because the file does not say it; shown in the preview. */
  readonly assumptions?: readonly string[];
}

/** Thrown inside the readers only; the public functions turn it into an outcome. */
export class ReadingError extends Error {
  readonly code: ReadingErrorCode;
  constructor(code: ReadingErrorCode, message: string) {
    super(message);
    this.code = code;
  }
}

export const readingLimits = {
  /** Of a file, bytes. */
  bytes: 50e6,
  /** Of all spectra of a file together. */
  points: 1_000_000,
  spectra: 500,
} as const;
