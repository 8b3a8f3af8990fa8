export { formatFigures, formatGiven, formatShare, writeToStep } from './formatNumber';
export { writeRange } from './formatRange';
export { NumberWithRange, type NumberWithRangeProps } from './NumberWithRange';
export { intervalUnit, UnitProvider, useUnit, type UnitChoice } from './UnitContext';
export { energyUnits, unitSpoken, unitText } from './unitNames';
export { UnitSwitch } from './UnitSwitch';
export { MeasuredNumber } from './MeasuredNumber';
