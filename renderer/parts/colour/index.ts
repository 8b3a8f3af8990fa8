export { cloudInWords, CloudStrip } from './CloudStrip';
export { colourNumbers, sortedByHue } from './colourNumbers';
export { passedInWords, passedRanges, transmittanceAt, type VisibleTransmittance } from './passedRanges';
export { spectralColour, spectrumGradient, visibleFrom_nm, visibleTo_nm } from './spectralColour';
export { Swatch } from './Swatch';
export { SwatchTrio } from './SwatchTrio';
export { TransmissionScale, TransmissionStrip } from './TransmissionStrip';
