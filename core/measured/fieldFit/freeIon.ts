import { defaultLibrary, ionName } from '../../library';

/** B of the free ion that a fitted B is compared with. */
export interface FreeIonLimit {
  readonly value: number;
  /** `the free-ion value of Cr3+`, or what stands in where no ion was named. */
  readonly of: string;
}

/** Where no ion is named, the largest B of all listed ions of the same d count stands as the limit. */
export function freeIonB(request: {
  readonly dElectrons: number;
  readonly metal?: string;
  readonly oxidationState?: number;
}): FreeIonLimit {
  if (request.metal !== undefined && request.oxidationState !== undefined) {
    const name = ionName(request.metal, request.oxidationState);
    const value = defaultLibrary.ions.get(name)?.B0.value;
    if (value != null) return { value, of: `the free-ion value of ${name}` };
  }
  let best: FreeIonLimit = { value: 0, of: '' };
  for (const ion of defaultLibrary.ions.values()) {
    const value = ion.dElectrons === request.dElectrons ? ion.B0.value : null;
    if (value !== null && value > best.value)
      best = { value, of: `the largest free-ion value listed for d${request.dElectrons}` };
  }
  return best.value > 0 ? best : { value: 1300, of: 'the free-ion values of the 3d series' };
}
