import { agreementReport, compareComplex, readMeasuredSet } from '../../../core/agreement';
import { SpinhueError } from '../../../core/errors';
import { comparisonLines, reportLines } from '../agreementTable';
import type { Command } from '../command';

export const agreement: Command = {
  name: 'agreement',
  usage: 'FILE.json [--json | --summary]',
  summary: 'predicted beside measured for published complexes, and how good the estimates are',
  options: { json: 'flag', summary: 'flag' },
  operands: { min: 1, max: 1 },
  async run({ operands, options }, io) {
    const name = operands[0]!;
    const set = readMeasuredSet(await io.readJson(name));
    if (!set.ok) {
      const [problem] = set.problems as [(typeof set.problems)[number]];
      throw new SpinhueError({ ...problem, message: `${name}: ${problem.message}` });
    }
    const comparisons = set.value.map((complex) => compareComplex(complex));
    const groups = {
      tuning: comparisons.filter(({ useForTuning }) => useForTuning),
      heldOut: comparisons.filter(({ useForTuning }) => !useForTuning),
    };
    const reports = {
      all: agreementReport(comparisons),
      tuning: agreementReport(groups.tuning),
      heldOut: agreementReport(groups.heldOut),
    };
    if (options.has('json')) return { complexes: comparisons, reports };
    return [
      ...(options.has('summary') ? [] : [...comparisonLines(comparisons), '']),
      ...reportLines('All', reports.all),
      ...reportLines('May inform parameters', reports.tuning),
      ...reportLines('Held out, for testing only', reports.heldOut),
    ].join('\n');
  },
};
