import { z } from 'zod';
import { fitBands as fit } from '../../../core/measured/bandFit/fitBands';
import type { Command } from '../command';
import { parseInput } from '../parseInput';

const limits = z.tuple([z.number(), z.number()]);
const schema = z.looseObject({
  wavenumber_cm1: z.array(z.number()).max(200_000),
  absorbance: z.array(z.number().nullable()).max(200_000),
  start: z.array(z.looseObject({ centre_cm1: z.number(), fwhm_cm1: z.number(), height: z.number() })).max(20),
  baseline: z.enum(['none', 'linear']),
  bounds: z
    .strictObject({ centre_cm1: limits.optional(), fwhm_cm1: limits.optional(), height: limits.optional() })
    .optional(),
});

export const fitBands: Command = {
  name: 'fit-bands',
  usage: 'FILE.json',
  summary: 'fit a sum of Gaussians in wavenumber, with standard errors and correlation',
  options: {},
  operands: { min: 1, max: 1 },
  async run(args, io) {
    const file = args.operands[0]!;
    const { wavenumber_cm1, absorbance, start, baseline, bounds } = parseInput(
      schema,
      await io.readJson(file),
      file,
    );
    const { curve: _curve, ...result } = fit({
      wavenumber_cm1,
      absorbance,
      start,
      baseline,
      ...(bounds === undefined ? {} : { bounds: JSON.parse(JSON.stringify(bounds)) as object }),
    });
    return result;
  },
};
