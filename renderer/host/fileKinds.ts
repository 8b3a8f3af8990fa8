import type { FileKind } from './bridge';

/** Endings that a dialog offers, the first one being the default. */
export const fileKinds: Readonly<
  Record<FileKind, { readonly title: string; readonly endings: readonly string[] }>
> = {
  bundle: { title: 'Project bundle', endings: ['spinhue', 'json'] },
  spectrum: { title: 'Spectrum', endings: ['csv', 'txt', 'tsv', 'dat', 'asc', 'jdx', 'dx', 'jcamp'] },
  json: { title: 'JSON', endings: ['json'] },
  csv: { title: 'Table (CSV)', endings: ['csv', 'tsv', 'txt'] },
  text: { title: 'Text', endings: ['txt', 'md'] },
  html: { title: 'Web page', endings: ['html'] },
  svg: { title: 'Vector drawing', endings: ['svg'] },
  png: { title: 'Picture', endings: ['png'] },
  pdf: { title: 'PDF', endings: ['pdf'] },
  any: { title: 'Any file', endings: [] },
};

const mediaTypes: Partial<Record<FileKind, string>> = {
  bundle: 'application/json',
  json: 'application/json',
  csv: 'text/csv',
  html: 'text/html',
  svg: 'image/svg+xml',
  png: 'image/png',
  pdf: 'application/pdf',
};
export const mediaType = (kind: FileKind): string => mediaTypes[kind] ?? 'text/plain';
