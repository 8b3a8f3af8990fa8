import type { BandInput, BandPrediction } from './bandInput';
import { ctSigma_cm1 } from './chargeTransfer/ctBand';
import { commonDoubts } from './bandSigma';
import { ligandToMetalBands } from './chargeTransfer/ligandToMetal';
import { metalToLigandBands } from './chargeTransfer/metalToLigand';
import { chargeTransferRemarks } from './chargeTransfer/remarks';
import { coordinationSymmetry } from './coordinationSymmetry';
import { ddBands } from './ddBands';
import { groundState, levelsFrom } from './groundState';

function leftOut({ geometry, ligands }: BandInput, split: boolean): string[] {
  const out = ['Solvent and ion-pair shifts of charge-transfer bands.', "The ligands' own bands."];
  if (geometry === 'octahedral' && new Set(ligands.map(({ ligand }) => ligand.id)).size > 1 && !split) {
    out.push('Splitting of bands by unlike ligands: each band stands for the mean of its components.');
  }
  return out;
}

/**
 * The bands a UV-Vis-NIR instrument would show, ascending: d-d bands from the levels and charge transfer from
 * electronegativities or redox potentials, each with place, width and strength as ranges. Needs no levels: without them
 * only charge transfer is told. Never throws for chemistry.
 */
export function predictBands(given: BandInput): BandPrediction {
  const input = { ...given, levels: levelsFrom(given.levels, given.groundMultiplicity) };
  const ground = groundState(input);
  const symmetry = coordinationSymmetry(input);
  const toMetal = ligandToMetalBands(input, ground);
  const toLigand = metalToLigandBands(input, ground);
  const transfer = [...toMetal.bands, ...toLigand.bands];
  const edges = transfer.filter(({ sigma_cm1 }) => sigma_cm1 <= ctSigma_cm1.own);
  const edge_cm1 = edges.length === 0 ? null : Math.min(...edges.map(({ energy_cm1 }) => energy_cm1));
  const hasDd = input.dElectrons > 0 && input.dElectrons < 10;
  const dd = hasDd ? ddBands({ input, ground, symmetry, doubts: commonDoubts(input), edge_cm1 }) : [];
  const bands = [...dd, ...transfer].sort((a, b) => a.energy_cm1 - b.energy_cm1);
  const toldAll = toMetal.withoutNumber.length === 0 && toLigand.withoutNumber.length === 0;
  return {
    bands,
    complete: bands.length > 0 || (!hasDd && toldAll),
    flags: chargeTransferRemarks(input, bands, toMetal.withoutNumber, toLigand.withoutNumber),
    leftOut: leftOut(
      input,
      dd.some(({ component }) => component !== undefined),
    ),
  };
}
