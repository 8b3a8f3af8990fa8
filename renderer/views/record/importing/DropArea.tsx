import { useState, type DragEvent, type ReactNode } from 'react';
import type { IncomingFile } from './useReadings';

interface DropAreaProps {
  readonly onFiles: (files: readonly IncomingFile[]) => void;
  readonly children: ReactNode;
}

/** No spectrum file is larger than this, whatever else may be dropped by mistake. */
const most_bytes = 50e6;

export const incomingFrom = async (files: Iterable<File>): Promise<IncomingFile[]> => {
  const read: IncomingFile[] = [];
  for (const file of files) {
    // A file that is far too large is cut: the reader then refuses it by its size, with the limit in words.
    const part = file.size > most_bytes ? file.slice(0, most_bytes + 1) : file;
    read.push({ name: file.name, bytes: new Uint8Array(await part.arrayBuffer()) });
  }
  return read;
};

const holdsFiles = ({ dataTransfer }: DragEvent): boolean => [...dataTransfer.types].includes('Files');

/** Takes files dropped anywhere on what it holds. */
export function DropArea({ onFiles, children }: DropAreaProps) {
  const [over, setOver] = useState(false);
  return (
    <div
      className="drop-area"
      data-over={over || undefined}
      onDragOver={(event) => {
        if (!holdsFiles(event)) return;
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget as Node | null)) setOver(false);
      }}
      onDrop={(event) => {
        if (!holdsFiles(event)) return;
        event.preventDefault();
        setOver(false);
        const { files } = event.dataTransfer;
        void incomingFrom(files).then((read) => read.length > 0 && onFiles(read));
      }}
    >
      {children}
      {over && <p className="drop-area-words">Drop spectrum files here to read them</p>}
    </div>
  );
}
