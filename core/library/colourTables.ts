import illuminantFile from './data/colour/illuminants.json';
import observerFile from './data/colour/observers.json';

/** CIE 1931 (2 degrees) and CIE 1964 (10 degrees) standard colorimetric observers. */
export const observerIds = ['2deg', '10deg'] as const;
export type ObserverId = (typeof observerIds)[number];

export const illuminantIds = ['D65', 'A', 'D50', 'F2', 'F11', 'LED-B3'] as const;
export type IlluminantId = (typeof illuminantIds)[number];

/** Colour-matching functions at `visibleWavelengths_nm`. */
export interface Observer {
  readonly id: ObserverId;
  readonly name: string;
  readonly source: string;
  readonly x: readonly number[];
  readonly y: readonly number[];
  readonly z: readonly number[];
}

/** Relative spectral power at `visibleWavelengths_nm`. */
export interface Illuminant {
  readonly id: IlluminantId;
  readonly name: string;
  readonly source: string;
  readonly power: readonly number[];
}

const { from_nm, to_nm, step_nm } = observerFile.grid;

/** 380 to 780 nm in steps of 5 nm: the grid of every colour computation here. */
export const visibleWavelengths_nm: readonly number[] = Array.from(
  { length: (to_nm - from_nm) / step_nm + 1 },
  (_, index) => from_nm + index * step_nm,
);

const observerNames: Record<ObserverId, string> = {
  '2deg': 'CIE 1931, 2 degrees',
  '10deg': 'CIE 1964, 10 degrees',
};

const onGrid = (id: string, ...columns: readonly (readonly number[])[]): void => {
  for (const column of columns) {
    if (column.length !== visibleWavelengths_nm.length)
      throw new Error(`the colour table of ${id} has a gap`);
  }
};

function readObserver(id: ObserverId): Observer {
  const { source, x, y, z } = observerFile[id];
  onGrid(id, x, y, z);
  return { id, name: observerNames[id], source, x, y, z };
}

function readIlluminant(id: IlluminantId): Illuminant {
  const { name, source, power } = illuminantFile[id];
  onGrid(id, power);
  return { id, name, source, power };
}

export const observers = Object.fromEntries(observerIds.map((id) => [id, readObserver(id)])) as Record<
  ObserverId,
  Observer
>;
export const illuminants = Object.fromEntries(illuminantIds.map((id) => [id, readIlluminant(id)])) as Record<
  IlluminantId,
  Illuminant
>;
