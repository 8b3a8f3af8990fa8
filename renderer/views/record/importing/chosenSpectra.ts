import type { ReadSpectrum } from '../../../../core/measured/reading/types';
import type { Curve } from '../../../../core/record/curve';
import type { StoredFile } from '../../../../core/record/file';
import type { ReadFile } from './useReadings';

/** One spectrum that can be kept, with where it stands in its file. */
export interface FoundSpectrum {
  readonly key: string;
  readonly fileName: string;
  readonly file: StoredFile;
  readonly index: number;
  readonly spectrum: ReadSpectrum;
  readonly curve: Curve;
}

/** Spectra of all files that were read. */
export const foundIn = (files: readonly ReadFile[]): FoundSpectrum[] =>
  files.flatMap(({ name, result }, place) =>
    (result?.reading.spectra ?? []).map((spectrum, index) => ({
      key: `${place} ${index}`,
      fileName: name,
      file: result!.file,
      index,
      spectrum,
      curve: result!.curves[index]!,
    })),
  );

/** What must be said before the numbers mean anything; null where nothing is open. */
export function openQuestion({ spectrum }: FoundSpectrum): string | null {
  const open = [spectrum.xUnit === 'unknown' && 'x', spectrum.yUnit === 'unknown' && 'y'].filter(Boolean);
  return open.length === 0
    ? null
    : `The file does not say what ${open.join(' and ')} hold${open.length > 1 ? '' : 's'}.`;
}

/** A name that the record accepts: without folders and control characters. */
export const plainName = (name: string): string =>
  name.replace(/[/\\\u0000-\u001f\u007f]/g, '_').slice(0, 255) || 'unnamed';
