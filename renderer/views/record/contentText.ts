import type { MeasurementContent } from '../../../core/record/measurement';
import { formatFigures } from '../../parts';

const methodWords = {
  Evans: 'Evans',
  balance: 'balance',
  magnetometer: 'magnetometer',
  typed: 'method not stated',
};

/** A measurement in one line. */
export function contentText(content: MeasurementContent): string {
  switch (content.kind) {
    case 'band list': {
      const nm = content.reportedIn === 'nm';
      const places = content.bands.map(({ energy_cm1: { value }, molarAbsorptivity, feature }) => {
        const place = formatFigures(nm ? 1e7 / value : value, nm ? 4 : 5);
        const strength =
          molarAbsorptivity === null ? '' : ` (ε ${formatFigures(molarAbsorptivity.value, 3)})`;
        return `${place}${feature === 'shoulder' ? ' sh' : ''}${strength}`;
      });
      return `Bands: ${places.join(', ')} ${nm ? 'nm' : 'cm⁻¹'}`;
    }
    case 'moment': {
      const { value, u } = content.moment_BM;
      const spread = u === null ? '' : ` ± ${formatFigures(u, 2)}`;
      return `Moment ${formatFigures(value, 3)}${spread} μB (${methodWords[content.method]})`;
    }
    case 'observed colour':
      return `Colour seen: ${content.words}`;
    case 'note':
      return `Note: ${content.remark}`;
    case 'spectrum':
      return `Spectrum: ${content.name ?? content.source?.fileName ?? 'pasted'}`;
    case 'moment series': {
      const temperatures = content.points.map(({ temperature_K }) => temperature_K);
      const [low, high] = [Math.min(...temperatures), Math.max(...temperatures)];
      return `Moments at ${content.points.length} temperatures, ${low} to ${high} K`;
    }
    case 'emission': {
      const places = content.maxima.map(({ energy_cm1 }) => formatFigures(1e7 / energy_cm1.value, 4));
      return `Emission: ${places.join(', ')} nm`;
    }
  }
}
