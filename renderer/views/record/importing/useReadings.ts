import { useCallback, useEffect, useRef, useState } from 'react';
import type { DelimitedChoices } from '../../../../core/measured/delimited/read';
import type { FileReading, StatedUnits } from '../../../workers/reading/protocol';
import { readInWorker } from '../../../workers/reading/readInWorker';

/** Bytes on their way into the record. */
export interface IncomingFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** One file with what was made of it so far. */
export interface ReadFile extends IncomingFile {
  readonly choices: DelimitedChoices;
  readonly units: StatedUnits;
  /** Null while it is being read. */
  readonly result: FileReading | null;
  /** Why reading broke off; null where it did not. */
  readonly broke: string | null;
}

const unread = ({ name, bytes }: IncomingFile): ReadFile => ({
  name,
  bytes,
  choices: {},
  units: {},
  result: null,
  broke: null,
});

interface Readings {
  readonly files: readonly ReadFile[];
  /** Reads one file again with other choices. */
  readonly choose: (index: number, choices: DelimitedChoices, units: StatedUnits) => void;
}

/** Reads files one after the other beside the window; the dialog stays open to the user meanwhile. */
export function useReadings(incoming: readonly IncomingFile[]): Readings {
  const [files, setFiles] = useState<readonly ReadFile[]>(() => incoming.map(unread));
  const stop = useRef(new AbortController());
  const put = useCallback(
    (index: number, change: Partial<ReadFile>) =>
      setFiles((before) => before.map((file, place) => (place === index ? { ...file, ...change } : file))),
    [],
  );
  const read = useCallback(
    async (index: number, { bytes }: IncomingFile, choices: DelimitedChoices, units: StatedUnits) => {
      try {
        const result = await readInWorker({ bytes, mediaType: '', choices, units }, stop.current.signal);
        put(index, { result, broke: null });
      } catch (error) {
        if (!stop.current.signal.aborted)
          put(index, { broke: error instanceof Error ? error.message : String(error) });
      }
    },
    [put],
  );
  useEffect(() => {
    stop.current = new AbortController();
    const all = async (): Promise<void> => {
      for (const [index, file] of incoming.entries()) await read(index, file, {}, {});
    };
    void all();
    return () => stop.current.abort();
  }, [incoming, read]);
  const choose = useCallback(
    (index: number, choices: DelimitedChoices, units: StatedUnits) => {
      put(index, { choices, units, result: null, broke: null });
      void read(index, incoming[index]!, choices, units);
    },
    [incoming, put, read],
  );
  return { files, choose };
}
