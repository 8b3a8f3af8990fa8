import { accepted, type Checked, type Problem } from '../../errors';
import type { ParameterLibrary } from '../../library';
import { problemsFromZod } from '../../record/zodProblems';
import { contradictions } from './contradictions';
import { wishSchema, type Wish } from './wish';

const near = (text: string, known: Iterable<string>): string | undefined =>
  [...known].find((each) => each.toLowerCase() === text.toLowerCase());

function unknownNames(
  names: readonly string[],
  known: { has(name: string): boolean; keys(): Iterable<string> },
  what: { readonly field: string; readonly kind: string; readonly code: Problem['code'] },
): Problem[] {
  return names.flatMap((name, i) => {
    if (known.has(name)) return [];
    const meant = near(name, known.keys());
    return [
      {
        code: what.code,
        message: `${what.field}[${i}]: ${what.kind} "${name}" is not in the library`,
        field: `${what.field}[${i}]`,
        remedy: meant === undefined ? `see the library for the ids it has` : `did you mean ${meant}?`,
      },
    ];
  });
}

/**
 * A wish with its defaults filled in, or everything that is wrong with it: malformed fields, names that the library
 * does not have, and wishes that no complex can meet.
 */
export function checkWish(input: unknown, library: ParameterLibrary): Checked<Wish> {
  const parsed = wishSchema.safeParse(input);
  if (!parsed.success) return { ok: false, problems: problemsFromZod(parsed.error, '') };
  const wish = parsed.data;
  const { allow, exclude, shelf } = wish.ligands;
  const problems = [
    ...(wish.ions === 'all'
      ? []
      : unknownNames(wish.ions, library.ions, { field: 'ions', kind: 'ion', code: 'unknown-ion' })),
    ...(
      [
        ['ligands.allow', allow === 'all' ? [] : allow],
        ['ligands.exclude', exclude],
        ['ligands.shelf', shelf ?? []],
      ] as const
    ).flatMap(([field, names]) =>
      unknownNames(names, library.ligands, { field, kind: 'ligand', code: 'unknown-ligand' }),
    ),
  ];
  if (problems.length > 0) return { ok: false, problems };
  const against = contradictions(wish, library);
  return against.length > 0 ? { ok: false, problems: against } : accepted(wish);
}
