import type { Problem } from '../../../core/errors';
import { readBundle, type BundleContent } from '../../../core/record/bundle';
import { type ImportPlan, planImport, type Store } from '../../store';

/** What a chosen file holds and what taking it would do; nothing has been changed yet. */
export interface ImportOffer {
  readonly fileName: string;
  /** Null where nothing in the file can be used. */
  readonly plan: ImportPlan | null;
  /** What is wrong with the file; with a plan: the rows that passed are offered, the others are left out. */
  readonly problems: readonly Problem[];
}

export async function readImport(
  store: Store,
  file: { readonly name: string; readonly bytes: Uint8Array },
): Promise<ImportOffer> {
  const reading = readBundle(file.bytes);
  const content: BundleContent | null = reading.ok ? reading.content : reading.salvage;
  const problems = reading.ok ? [] : reading.problems;
  if (content === null) return { fileName: file.name, plan: null, problems };
  try {
    return { fileName: file.name, plan: await planImport(store.db, content), problems };
  } catch (error) {
    const { message, remedy } = error as { message: string; remedy?: string };
    const problem: Problem = {
      code: 'integrity',
      field: '',
      message,
      ...(remedy === undefined ? {} : { remedy }),
    };
    return { fileName: file.name, plan: null, problems: [...problems, problem] };
  }
}
