import type { Flag } from '../../estimation/types';
import type { BandInput } from '../bandInput';
import type { Band } from '../types';
import { hiddenBands } from './hiddenBands';

const list = (names: readonly string[]): string => [...new Set(names)].join(', ');
const nm = ({ wavelength_nm }: Band): string => `${Math.round(wavelength_nm / 10) * 10}`;

/** What has to be said of shells without transitions of their own. */
function emptyOrFull({ dElectrons }: BandInput): Flag[] {
  if (dElectrons !== 0 && dElectrons !== 10) return [];
  const shell = dElectrons === 0 ? 'empty' : 'full';
  return [
    {
      code: 'no-dd-bands',
      severity: 'note',
      message: `d${dElectrons}: the d shell is ${shell}, so there are no d-d bands; any colour is charge transfer or the ligands' own.`,
    },
  ];
}

function hidden(bands: readonly Band[]): Flag[] {
  const drowned = hiddenBands(bands).filter(({ band }) => band.kind === 'spin-allowed');
  if (drowned.length === 0) return [];
  const surely = drowned.filter(({ how }) => how === 'hidden').map(({ band }) => nm(band));
  const perhaps = drowned.filter(({ how }) => how === 'may be hidden').map(({ band }) => nm(band));
  const parts = [
    ...(surely.length > 0 ? [`hide the d-d bands near ${list(surely)} nm`] : []),
    ...(perhaps.length > 0 ? [`may hide those near ${list(perhaps)} nm`] : []),
  ];
  return [
    {
      code: 'charge-transfer-hides-dd',
      severity: 'caution',
      message: `Charge-transfer bands ${parts.join(' and ')}.`,
    },
  ];
}

function withoutNumber(toMetal: readonly string[], toLigand: readonly string[], symbol: string): Flag[] {
  const flags: Flag[] = [];
  if (toMetal.length > 0) {
    flags.push({
      code: 'lmct-possible',
      severity: 'caution',
      message: `${list(toMetal)} to ${symbol}: ligand-to-metal charge transfer is likely, its place is not estimated; it may hide d-d bands and rule the colour.`,
    });
  }
  if (toLigand.length > 0) {
    flags.push({
      code: 'mlct-possible',
      severity: 'caution',
      message: `${symbol} to ${list(toLigand)}: metal-to-ligand charge transfer is likely, its place is not estimated; it may hide d-d bands and rule the colour.`,
    });
  }
  return flags;
}

/** Mixed valence is a matter of the solid or the dimer, which a single complex ion does not tell. */
function intervalence({ ion, ligands }: BandInput): Flag[] {
  const bridging = ligands.filter(({ ligand }) => ligand.id === 'cn' || ligand.id === 'oxo');
  const mixes = ['Fe', 'Ru', 'Os', 'Mn', 'Mo', 'W', 'V'].includes(ion.symbol);
  if (!mixes || bridging.length === 0 || ion.dElectrons === 0) return [];
  return [
    {
      code: 'intervalence-possible',
      severity: 'note',
      message: `${list(bridging.map(({ ligand }) => ligand.commonName))} can bridge: with ${ion.symbol} in two oxidation states an intervalence band appears that is not predicted.`,
    },
  ];
}

/** Remarks on charge transfer for the whole complex. */
export const chargeTransferRemarks = (
  input: BandInput,
  bands: readonly Band[],
  toMetal: readonly string[],
  toLigand: readonly string[],
): Flag[] => [
  ...emptyOrFull(input),
  ...hidden(bands),
  ...withoutNumber(toMetal, toLigand, input.ion.symbol),
  ...intervalence(input),
];
