import { defaultLibrary } from '../../../core/library';
import { checkWish, countCandidates, relaxations, searchWish, spaceOf } from '../../../core/search';
import { SpinhueError } from '../../../core/errors';
import type { Command } from '../command';

const mostResults = 10_000;

function topOf(option: string | true | undefined): number {
  if (option === undefined) return 20;
  const top = Number(option);
  if (Number.isInteger(top) && top >= 1 && top <= mostResults) return top;
  throw new SpinhueError({
    code: 'usage',
    message: `search: --top takes a whole number from 1 to ${mostResults}, not ${String(option)}`,
    field: '--top',
  });
}

export const search: Command = {
  name: 'search',
  usage: 'WISH.json [--top K] [--count] [--brute]',
  summary: 'the metal and ligand sets most likely to meet a wish',
  options: { top: 'value', count: 'flag', brute: 'flag' },
  operands: { min: 1, max: 1 },
  async run({ operands, options }, io) {
    const top = topOf(options.get('top'));
    const checked = checkWish(await io.readJson(operands[0]!), defaultLibrary);
    if (!checked.ok) {
      for (const problem of checked.problems.slice(1)) io.note(`headless: ${problem.message}`);
      throw new SpinhueError(checked.problems[0]!);
    }
    if (options.has('count')) return { count: countCandidates(spaceOf(checked.value, defaultLibrary)) };
    const run = searchWish(checked.value, defaultLibrary, { top, brute: options.has('brute') });
    let step = run.next();
    while (step.done !== true) step = run.next();
    const { count, evaluated, skipped, results } = step.value;
    return {
      count,
      evaluated,
      skipped,
      ...(results.length > 0 ? {} : { advice: relaxations(checked.value, defaultLibrary).slice(0, 5) }),
      results: results.map(
        ({ id, metal, oxidationState, geometry, isomer, ligands, formula, ...score }, i) => ({
          rank: i + 1,
          id,
          formula,
          metal,
          oxidationState,
          geometry,
          isomer: isomer ?? null,
          ligands,
          ...score,
        }),
      ),
    };
  },
};
