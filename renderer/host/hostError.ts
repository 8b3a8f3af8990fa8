export const hostErrorCodes = [
  /** The request itself is not acceptable: wrong shape, unknown id, sender that is not our page. */
  'refused',
  'unreadable',
  'unwritable',
  'disk-full',
  /** Another program holds the file. */
  'locked',
  /** The chosen folder is missing, is a file, or cannot be written to. */
  'no-folder',
  'damaged',
  'too-large',
  'not-found',
  /** This host cannot do it; the remedy says which one can. */
  'unavailable',
  'failed',
] as const;
export type HostErrorCode = (typeof hostErrorCodes)[number];

export interface HostProblem {
  readonly code: HostErrorCode;
  /** A sentence for a person that names the file or folder. */
  readonly message: string;
  readonly remedy: string;
}

/** What the host could not do, with a way out. The interface switches on `code`. */
export class HostError extends Error implements HostProblem {
  override readonly name = 'HostError';
  readonly code: HostErrorCode;
  readonly remedy: string;

  constructor({ code, message, remedy }: HostProblem, cause?: unknown) {
    super(message, { cause });
    this.code = code;
    this.remedy = remedy;
  }
}
