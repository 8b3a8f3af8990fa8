import { ReadingError } from '../reading/types';

export interface TextLine {
  readonly text: string;
  /** From 1. */
  readonly number: number;
}

/** A labelled data record: `##LABEL= value`, the value possibly over several lines. */
export interface LabelledRecord {
  /** Upper case without blanks, hyphens, slashes and underscores: the form in which labels are compared. */
  readonly label: string;
  /** As written. */
  readonly written: string;
  readonly line: number;
  /** The text after `=` and the lines that follow, comments removed. */
  readonly lines: readonly TextLine[];
}

export const labelKey = (written: string): string => written.replace(/[\s\-/_]/g, '').toUpperCase();

/** First line of a record's value, trimmed. */
export const valueOf = (record: LabelledRecord): string =>
  record.lines.map((line) => line.text.trim()).find((text) => text !== '') ?? '';

/**
 * Cuts a JCAMP-DX file into its labelled data records (McDonald and Wilks, Appl. Spectrosc. 42, 151, 1988): a record
 * starts at `##` and ends before the next; `$$` starts a comment that runs to the end of the line.
 */
export function labelledRecords(text: string): LabelledRecord[] {
  const records: { label: string; written: string; line: number; lines: TextLine[] }[] = [];
  for (const [i, raw] of text.split(/\r\n|\r|\n/).entries()) {
    const number = i + 1;
    const comment = raw.indexOf('$$');
    const line = comment >= 0 ? raw.slice(0, comment) : raw;
    const start = line.trimStart();
    if (!start.startsWith('##')) {
      if (records.length > 0) records.at(-1)!.lines.push({ text: line, number });
      else if (line.trim() !== '' && line.trim() !== '\u001a') {
        throw new ReadingError('structure', `line ${number} comes before the first ## label`);
      }
      continue;
    }
    const equals = start.indexOf('=');
    if (equals < 0) throw new ReadingError('structure', `line ${number}: a ## label without "="`);
    const written = start.slice(2, equals).trim();
    records.push({
      label: labelKey(written),
      written,
      line: number,
      lines: [{ text: start.slice(equals + 1), number }],
    });
  }
  return records;
}
