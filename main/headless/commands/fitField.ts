import { z } from 'zod';
import { fitField as fit, type FieldFitRequest } from '../../../core/measured/fieldFit/fitField';
import { geometryIds } from '../../../core/record/composition';
import type { Command } from '../command';
import { parseInput } from '../parseInput';

const schema = z.looseObject({
  dElectrons: z.number(),
  geometry: z.enum([...geometryIds, 'tetragonal']),
  bands: z.array(
    z.looseObject({
      energy_cm1: z.number(),
      se_cm1: z.number().nullish(),
      multiplicity: z.int().positive().nullish(),
      label: z.string().max(200).nullish(),
    }),
  ),
  groundMultiplicity: z.int().positive().optional(),
  ratioCB: z.number().positive().optional(),
  metal: z.string().optional(),
  oxidationState: z.int().optional(),
});

export const fitField: Command = {
  name: 'fit-field',
  usage: 'FILE.json',
  summary: 'fit 10Dq, B and C to band positions; says what the bands cannot tell',
  options: {},
  operands: { min: 1, max: 1 },
  async run(args, io) {
    const file = args.operands[0]!;
    return fit(parseInput(schema, await io.readJson(file), file) as FieldFitRequest);
  },
};
