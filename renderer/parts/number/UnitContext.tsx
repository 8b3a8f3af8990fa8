import { createContext, use, useMemo, useState, type ReactNode } from 'react';
import { type EnergyUnit } from '../../../core/units';

export interface UnitChoice {
  readonly unit: EnergyUnit;
  readonly setUnit: (unit: EnergyUnit) => void;
}

const UnitContext = createContext<UnitChoice>({ unit: 'cm-1', setUnit: () => undefined });

interface UnitProviderProps {
  /** Unit to start in where the choice is kept here. */
  readonly initial?: EnergyUnit;
  /** Given together with `onChange`, the choice is kept outside (in the settings, say). */
  readonly unit?: EnergyUnit;
  readonly onChange?: (unit: EnergyUnit) => void;
  readonly children: ReactNode;
}

/** The unit in which every energy below it is shown. */
export function UnitProvider({ initial = 'cm-1', unit, onChange, children }: UnitProviderProps) {
  const [own, setOwn] = useState<EnergyUnit>(initial);
  const shown = unit ?? own;
  const choice = useMemo<UnitChoice>(
    () => ({
      unit: shown,
      setUnit: (next) => {
        setOwn(next);
        onChange?.(next);
      },
    }),
    [shown, onChange],
  );
  return <UnitContext value={choice}>{children}</UnitContext>;
}

/** The unit chosen for energies of transitions, and how to change it. */
export const useUnit = (): UnitChoice => use(UnitContext);

/** The unit for intervals such as 10Dq or B: a wavelength would say nothing there, so nm becomes cm⁻¹. */
export const intervalUnit = (unit: EnergyUnit): EnergyUnit => (unit === 'nm' ? 'cm-1' : unit);
