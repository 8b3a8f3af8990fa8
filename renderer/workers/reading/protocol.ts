import type { DelimitedChoices } from '../../../core/measured/delimited/read';
import type { SpectrumReading } from '../../../core/measured/reading/types';
import type { Curve, XUnit, YUnit } from '../../../core/record/curve';
import type { StoredFile } from '../../../core/record/file';

export interface StatedUnits {
  readonly xUnit?: XUnit;
  readonly yUnit?: YUnit;
}

export interface ReadingRequest {
  readonly bytes: Uint8Array;
  readonly mediaType: string;
  readonly choices: DelimitedChoices;
  /** What the axes hold, where the file does not say it or says it wrongly. */
  readonly units?: StatedUnits;
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
