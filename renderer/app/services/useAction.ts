import { useCallback } from 'react';
import { useToast } from '../../parts';
import { asStoreError } from '../../store';

const hasRemedy = (error: unknown): error is Error & { remedy: string } =>
  error instanceof Error && typeof (error as { remedy?: unknown }).remedy === 'string';

/** One line for a person: what went wrong and what to do. */
export function inWords(error: unknown): string {
  const known = hasRemedy(error) ? error : asStoreError(error);
  return 'remedy' in known && known.remedy ? `${known.message} ${known.remedy}` : known.message;
}

/** Runs something that may fail; a failure is shown, never swallowed. Resolves to whether it went well. */
export function useAction(): (work: () => Promise<unknown>) => Promise<boolean> {
  const toast = useToast();
  return useCallback(
    async (work) => {
      try {
        await work();
        return true;
      } catch (error) {
        toast({ tone: 'danger', message: inWords(error) });
        return false;
      }
    },
    [toast],
  );
}
