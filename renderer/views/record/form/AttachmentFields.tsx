import { useState } from 'react';
import { storeFile, type StoredFile } from '../../../../core/record/file';
import { plainName } from '../importing/chosenSpectra';

export interface Attached {
  readonly name: string;
  readonly fileId: string;
  /** Null where it is in the record already. */
  readonly file: StoredFile | null;
}

interface AttachmentFieldsProps {
  readonly attached: readonly Attached[];
  readonly onChange: (attached: readonly Attached[]) => void;
}

/** Whole projects travel as one file: larger things belong beside it, with their name in a note. */
const most_bytes = 20e6;

/** Files kept with a measurement by the hash of their bytes: photos, raw files, PDF. */
export function AttachmentFields({ attached, onChange }: AttachmentFieldsProps) {
  const [refused, setRefused] = useState<string | null>(null);
  const add = async (files: Iterable<File>): Promise<void> => {
    const next = [...attached];
    const large: string[] = [];
    for (const each of files) {
      if (each.size > most_bytes) {
        large.push(each.name);
        continue;
      }
      const file = storeFile(new Uint8Array(await each.arrayBuffer()), each.type.slice(0, 100));
      if (!next.some(({ fileId }) => fileId === file.id))
        next.push({ name: plainName(each.name), fileId: file.id, file });
    }
    setRefused(
      large.length === 0
        ? null
        : `Larger than 20 MB and left out: ${large.join(', ')}. Keep it elsewhere and note where.`,
    );
    onChange(next);
  };
  return (
    <fieldset className="record-attachments">
      <legend>Attachments</legend>
      {attached.length > 0 && (
        <ul>
          {attached.map(({ name, fileId }) => (
            <li key={fileId}>
              {name} <span className="soft small">SHA-256 {fileId.slice(0, 12)}…</span>{' '}
              <button
                type="button"
                className="button-quiet"
                aria-label={`Leave out ${name}`}
                onClick={() => onChange(attached.filter((each) => each.fileId !== fileId))}
              >
                ✕
              </button>
            </li>
          ))}
        </ul>
      )}
      <input
        type="file"
        multiple
        aria-label="Attach files"
        onChange={(event) => {
          const input = event.currentTarget;
          void add([...(input.files ?? [])]).then(() => {
            input.value = '';
          });
        }}
      />
      {refused !== null && (
        <p className="field-error" role="alert">
          {refused}
        </p>
      )}
    </fieldset>
  );
}
