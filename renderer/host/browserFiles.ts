import type { FileData, FileKind, OpenedFile, SaveAnswer, SaveRequest } from './bridge';
import { fileKinds, mediaType } from './fileKinds';

const blobOf = (data: FileData, kind: FileKind): Blob =>
  new Blob([typeof data === 'string' ? data : new Uint8Array(data)], { type: mediaType(kind) });

/** Hands the file to the browser's downloads. */
export function download({ kind, suggestedName, data }: SaveRequest): SaveAnswer {
  const address = URL.createObjectURL(blobOf(data, kind));
  const anchor = document.createElement('a');
  anchor.href = address;
  anchor.download = suggestedName;
  anchor.click();
  // The download has its own reference once it began; a minute is ample.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
  return { saved: true, name: suggestedName, handle: null };
}

/** Asks for files with the browser's own dialog. */
export function upload(kind: FileKind, many: boolean): Promise<readonly OpenedFile[]> {
  const input = document.createElement('input');
  input.type = 'file';
  input.multiple = many;
  input.accept = fileKinds[kind].endings.map((ending) => `.${ending}`).join(',');
  input.hidden = true;
  // Inside the document, so that assistive technology and tests can find it.
  document.body.append(input);
  return new Promise<readonly OpenedFile[]>((resolve, reject) => {
    input.addEventListener('cancel', () => resolve([]));
    input.addEventListener('change', () => {
      Promise.all([...(input.files ?? [])].map(openedFile)).then(resolve, reject);
    });
    input.click();
  }).finally(() => input.remove());
}

/** Also for files dropped on the window. */
export async function openedFile(file: File): Promise<OpenedFile> {
  return {
    name: file.name,
    bytes: new Uint8Array(await file.arrayBuffer()),
    modifiedAt: new Date(file.lastModified).toISOString(),
    handle: null,
  };
}
