import { HostError, type HostErrorCode } from '../../renderer/host/hostError';

const byErrno: Readonly<Record<string, { code: HostErrorCode; why: string; remedy: string }>> = {
  ENOSPC: { code: 'disk-full', why: 'the disk is full', remedy: 'Free some space, then try again.' },
  EDQUOT: { code: 'disk-full', why: 'your quota is used up', remedy: 'Free some space, then try again.' },
  EFBIG: {
    code: 'too-large',
    why: 'the disk does not take files of this size',
    remedy: 'Choose another disk.',
  },
  EACCES: { code: 'unwritable', why: 'access was refused', remedy: 'Choose a folder that you may write to.' },
  EPERM: { code: 'unwritable', why: 'access was refused', remedy: 'Choose a folder that you may write to.' },
  EROFS: { code: 'unwritable', why: 'the disk is read-only', remedy: 'Choose another disk.' },
  EBUSY: {
    code: 'locked',
    why: 'another program holds it',
    remedy: 'Close the other program, then try again.',
  },
  ENOENT: { code: 'no-folder', why: 'it does not exist', remedy: 'Check that the disk is connected.' },
  ENOTDIR: { code: 'no-folder', why: 'a file is where a folder should be', remedy: 'Choose another folder.' },
  EISDIR: { code: 'unwritable', why: 'a folder has that name', remedy: 'Choose another name.' },
};

/** A sentence that names the file, for whatever the file system answered. */
export function asHostError(error: unknown, action: 'read' | 'write', path: string): HostError {
  if (error instanceof HostError) return error;
  const errno = (error as NodeJS.ErrnoException | null)?.code ?? '';
  const known = byErrno[errno];
  const why = known?.why ?? (errno || String((error as Error)?.message ?? error));
  const code = known?.code ?? (action === 'read' ? 'unreadable' : 'unwritable');
  return new HostError(
    {
      code: action === 'read' && code !== 'locked' && code !== 'no-folder' ? 'unreadable' : code,
      message: `Cannot ${action} ${path}: ${why}.`,
      remedy: known?.remedy ?? 'Try again, or choose another place.',
    },
    error,
  );
}
