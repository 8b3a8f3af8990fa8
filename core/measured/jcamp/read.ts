import { plausibility } from '../reading/plausibility';
import {
  ReadingError,
  readingLimits,
  type ReadSpectrum,
  type ReadingWarning,
  type SpectrumReading,
} from '../reading/types';
import { readBlock, shorten } from './block';
import { recordOf, splitBlocks, type Block } from './blocks';
import { labelledRecords, valueOf } from './labels';
import { readNtuples } from './ntuples';

/** Whether a text is JCAMP-DX: its first line that is not blank starts with a label. */
export const isJcamp = (text: string): boolean => /^\s*(?:\$\$[^\r\n]*\s+)*##/.test(text);

const typeOf = (block: Block): string => {
  const record = recordOf(block, 'DATATYPE');
  return record === undefined ? '' : valueOf(record).toUpperCase();
};
const isUvVis = (type: string): boolean => /UV|VIS\b|ULTRAVIOLET|ELECTRONIC|ABSORPTION/.test(type);
const isOther = (type: string): boolean =>
  /NMR|MASS|INFRARED|RAMAN|CHROMATOGRAM|X-?RAY|DIFFRACT|EPR|ESR|THERMO|LINK|CIRCULAR|FLUORESCENCE|EMISSION|IMS|MOBILITY/.test(
    type,
  );
const holdsData = (block: Block): boolean =>
  block.records.some((record) =>
    ['XYDATA', 'XYPOINTS', 'PEAKTABLE', 'DATATABLE', 'NTUPLES'].includes(record.label),
  );

/** Blocks to read; the others are named. Without a UV-Vis block, infrared ones are read too: d-d bands reach there. */
function chooseBlocks(blocks: readonly Block[], warnings: ReadingWarning[]): Block[] {
  const withData = blocks.filter((block) => !block.isLink && holdsData(block));
  if (withData.length === 0)
    throw new ReadingError('no-table', 'the file has JCAMP-DX labels but no spectrum');
  const wanted = withData.filter((block) => isUvVis(typeOf(block)) || !isOther(typeOf(block)));
  const chosen = wanted.length > 0 ? wanted : withData.filter((block) => /INFRARED/.test(typeOf(block)));
  const name = (block: Block) =>
    `"${shorten(block.title).slice(0, 60)}" (line ${block.line}, ${typeOf(block).slice(0, 40)})`;
  if (chosen.length === 0) {
    throw new ReadingError(
      'wrong-kind',
      `no UV-Vis spectrum in the file: ${withData.slice(0, 5).map(name).join(', ')}`,
    );
  }
  for (const block of blocks) {
    if (block.isLink && (holdsData(block) || recordOf(block, 'NPOINTS') !== undefined)) {
      warnings.push({
        code: 'recovered',
        message: `the LINK block at line ${block.line} announces or holds data of its own, which are left out: the ##TITLE= of an inner block may be missing`,
      });
    }
    if (block.isLink || chosen.includes(block)) continue;
    warnings.push({ code: 'skipped-block', message: `skipped ${name(block)}: not a UV-Vis spectrum` });
  }
  if (wanted.length === 0) {
    warnings.push({
      code: 'recovered',
      message: 'the spectrum is labelled INFRARED SPECTRUM; read as an absorption spectrum',
    });
  }
  for (const block of chosen) {
    if (typeOf(block) === '') {
      warnings.push({
        code: 'recovered',
        message: `the block at line ${block.line} has no DATA TYPE; read as UV-Vis`,
      });
    }
  }
  return chosen;
}

/** Warnings after which the numbers still are exactly what the file says. */
const harmless = new Set<ReadingWarning['code']>([
  'missing',
  'saturated',
  'duplicate-x',
  'skipped-block',
  'encoding',
]);

/**
 * Reads JCAMP-DX text: AFFN, PAC, SQZ, DIF and DUP forms, XYPOINTS, PEAK TABLE, LINK blocks and n-tuple pages. X and Y
 * checks are made on every line. A damaged block of a LINK file is left out with a message; the others are read.
 */
export function readJcamp(text: string): SpectrumReading {
  const warnings: ReadingWarning[] = [];
  const spectra: ReadSpectrum[] = [];
  try {
    const blocks = splitBlocks(labelledRecords(text), warnings);
    const declared = blocks.find((block) => block.isLink);
    const chosen = chooseBlocks(blocks, warnings);
    let left: number = readingLimits.points;
    let refusal: ReadingError | null = null;
    for (const block of chosen) {
      try {
        const read = recordOf(block, 'NTUPLES')
          ? readNtuples(block, left, warnings)
          : [readBlock(block, left, warnings)];
        for (const spectrum of read) left -= spectrum.x.length;
        spectra.push(...read);
      } catch (error) {
        if (!(error instanceof ReadingError)) throw error;
        if (declared === undefined) throw error;
        refusal ??= error;
        warnings.push({
          code: 'recovered',
          message: `left out the block "${shorten(block.title).slice(0, 60)}" (line ${block.line}): ${error.message}`,
        });
      }
    }
    if (spectra.length === 0 && refusal !== null) throw refusal;
  } catch (error) {
    if (!(error instanceof ReadingError)) throw error;
    return {
      format: 'jcamp-dx',
      outcome: 'error',
      warnings,
      error: { code: error.code, message: error.message },
      spectra: [],
    };
  }
  warnings.push(...spectra.flatMap(plausibility));
  const unknown = spectra.filter((each) => each.xUnit === 'unknown' || each.yUnit === 'unknown');
  for (const each of unknown) {
    warnings.push({
      code: 'units',
      message: `${each.name ?? 'the spectrum'}: the unit of ${each.xUnit === 'unknown' ? 'x' : 'y'} is missing or not known; say what it is`,
    });
  }
  const outcome =
    unknown.length > 0 ? 'ask' : warnings.some((warning) => !harmless.has(warning.code)) ? 'warning' : 'ok';
  return { format: 'jcamp-dx', outcome, warnings, spectra };
}
