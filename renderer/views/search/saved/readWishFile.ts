import { accepted, type Checked } from '../../../../core/errors';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { checkWish, type WishInput } from '../../../../core/search';

/** A wish from the text of a file; what is malformed is named field by field. Contradictions are left to the form. */
export function readWishFile(text: string, library: ParameterLibrary): Checked<WishInput> {
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch (error) {
    const message = `this is not JSON: ${error instanceof Error ? error.message : String(error)}`;
    return {
      ok: false,
      problems: [
        { code: 'malformed-json', message, field: '', remedy: 'choose a file that was exported as a wish' },
      ],
    };
  }
  const checked = checkWish(input, library);
  if (!checked.ok && checked.problems.some(({ code }) => code !== 'contradictory-wish')) return checked;
  return accepted(input as WishInput);
}
