import './SourceNote.css';

/** How a stored value was come by. */
export type SourceStatus = 'page' | 'memory' | 'own' | 'measured' | 'unknown';

const statusWords: Readonly<Record<SourceStatus, readonly [short: string, long: string]>> = {
  page: ['read', 'read in the source or on a page that cites it'],
  memory: ['from memory', 'from memory of the source, not checked against it'],
  own: ['own value', 'set in this project'],
  measured: ['measured', 'taken from a measurement in this project'],
  unknown: ['no source', 'nobody has said where this value comes from'],
};

interface SourceNoteProps {
  /** Author, title, year, page; null where none is known. */
  readonly source: string | null;
  readonly status: SourceStatus;
}

/** Where a value comes from and how far it was checked. */
export function SourceNote({ source, status }: SourceNoteProps) {
  const [short, long] = statusWords[source === null && status !== 'own' ? 'unknown' : status];
  return (
    <span className="source-note">
      <span className="source-note-status" data-status={status} title={long}>
        {short}
      </span>
      {source !== null && <span className="source-note-text"> {source}</span>}
    </span>
  );
}
