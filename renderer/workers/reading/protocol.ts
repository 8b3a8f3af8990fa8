import type { DelimitedChoices } from '../../../core/measured/delimited/read';
import type { SpectrumReading } from '../../../core/measured/reading/types';
import type { Curve } from '../../../core/record/curve';
import type { StoredFile } from '../../../core/record/file';

export interface ReadingRequest {
  readonly bytes: Uint8Array;
  readonly mediaType: string;
  readonly choices: DelimitedChoices;
}

/** What a file holds, ready to be kept. */
export interface FileReading {
  readonly reading: SpectrumReading;
  readonly file: StoredFile;
  /** One per spectrum of the reading, in its order. */
  readonly curves: readonly Curve[];
}

export type ReadingAnswer =
  { readonly ok: true; readonly value: FileReading } | { readonly ok: false; readonly message: string };
