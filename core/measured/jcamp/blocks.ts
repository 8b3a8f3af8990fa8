import { ReadingError, type ReadingWarning } from '../reading/types';
import { valueOf, type LabelledRecord } from './labels';

/** The records between `##TITLE=` and `##END=`, those of inner blocks left out. */
export interface Block {
  readonly title: string;
  readonly records: readonly LabelledRecord[];
  readonly isLink: boolean;
  /** Whether its `##END=` was there. */
  readonly closed: boolean;
  readonly line: number;
}

const deepestLink = 20;

/** Blocks in file order, LINK blocks included. A missing `##END=` is reported and leaves the block open. */
export function splitBlocks(records: readonly LabelledRecord[], warnings: ReadingWarning[]): Block[] {
  interface Open {
    title: string;
    records: LabelledRecord[];
    line: number;
    place: number;
  }
  const blocks: Block[] = [];
  const open: Open[] = [];
  const close = (block: Open, closed: boolean) => {
    const isLink = block.records.some(
      (each) => each.label === 'DATATYPE' && /^\s*LINK\b/i.test(valueOf(each)),
    );
    blocks[block.place] = { ...block, isLink, closed };
  };
  let places = 0;
  for (const record of records) {
    if (record.label === 'TITLE') {
      const outer = open.at(-1);
      const outerIsLink = outer?.records.some(
        (each) => each.label === 'BLOCKS' || /^\s*LINK\b/i.test(valueOf(each)),
      );
      if (outer !== undefined && !outerIsLink) {
        throw new ReadingError(
          'structure',
          `line ${record.line}: a block starts inside the block of line ${outer.line}, which is not a LINK block`,
        );
      }
      if (open.length >= deepestLink)
        throw new ReadingError('structure', `line ${record.line}: blocks nested too deeply`);
      open.push({ title: valueOf(record), records: [record], line: record.line, place: places++ });
    } else if (record.label === 'END') {
      const block = open.pop();
      if (block === undefined)
        throw new ReadingError('structure', `line ${record.line}: ##END= without a block`);
      close(block, true);
    } else {
      const block = open.at(-1);
      if (block === undefined) {
        throw new ReadingError(
          'structure',
          `line ${record.line}: ##${record.written.slice(0, 40)}= outside any block`,
        );
      }
      block.records.push(record);
    }
  }
  for (const block of open.reverse()) {
    close(block, false);
    warnings.push({
      code: 'no-end',
      message: `the block that starts at line ${block.line} has no ##END=: the file may be cut off`,
    });
  }
  return blocks;
}

/** Labels that decide about numbers: twice in one block with different values is a contradiction. */
const decisive = [
  ...['XUNITS', 'YUNITS', 'XFACTOR', 'YFACTOR', 'FIRSTX', 'LASTX', 'FIRSTY', 'DELTAX', 'NPOINTS', 'DATATYPE'],
  ...['XYDATA', 'XYPOINTS', 'PEAKTABLE'],
];

export function checkDuplicates(block: Block): void {
  for (const label of decisive) {
    const found = block.records.filter((record) => record.label === label);
    if (found.length > 1) {
      throw new ReadingError(
        'duplicate-label',
        `line ${found[1]!.line}: ##${found[1]!.written}= stands twice in one block (first at line ${found[0]!.line})`,
      );
    }
  }
}

export const recordOf = (block: Block, label: string): LabelledRecord | undefined =>
  block.records.find((record) => record.label === label);
