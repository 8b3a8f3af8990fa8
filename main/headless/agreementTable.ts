import type { AgreementReport, ComplexComparison, Share } from '../../core/agreement';

const percent = (value: number | null): string =>
  value === null || !Number.isFinite(value) ? '-' : `${(100 * value).toFixed(1)} %`;
const share = ({ share: part, hits, of }: Share): string => `${percent(part)} (${hits} of ${of})`;
const whole = (value: number | null | undefined): string => (value == null ? '-' : String(Math.round(value)));

function row(cells: readonly string[], widths: readonly number[]): string {
  return cells.map((cell, i) => (i === 0 ? cell.padEnd(widths[i]!) : cell.padStart(widths[i]!))).join('  ');
}

/** Predicted beside measured, one line per complex. */
export function comparisonLines(comparisons: readonly ComplexComparison[]): string[] {
  const head = ['complex', '10Dq', 'found', 'error', 'band 1', 'found', 'error', 'spin', 'found', 'route'];
  const rows = comparisons.map((each) => [
    each.id,
    whole(each.tenDq?.predicted),
    whole(each.tenDq?.measured),
    percent(each.tenDq?.relativeError ?? null),
    whole(each.firstBand?.predicted),
    whole(each.firstBand?.measured),
    percent(each.firstBand?.relativeError ?? null),
    each.spin === null
      ? '-'
      : each.spin.predicted + (each.spin.nearCrossover ? '?' : each.spin.badged ? '!' : ''),
    each.spin?.found ?? '-',
    each.problem ?? each.route,
  ]);
  const widths = head.map((cell, i) => Math.max(cell.length, ...rows.map((cells) => cells[i]!.length)));
  return [head, ...rows].map((cells) => row(cells, widths));
}

/** The figures that say how good the estimates are, for one group of complexes. */
export function reportLines(title: string, report: AgreementReport): string[] {
  const { firstBand, tenDq, tenDqNotAnchored, racahB } = report;
  return [
    `${title}: ${report.complexes} complexes`,
    `  first spin-allowed band   median error ${percent(firstBand.medianAbsolute)}, 90th percentile ${percent(firstBand.percentile90Absolute)}, bias ${percent(firstBand.bias)}, n ${firstBand.n}`,
    `  10Dq                      median error ${percent(tenDq.medianAbsolute)}, 90th percentile ${percent(tenDq.percentile90Absolute)}, bias ${percent(tenDq.bias)}, n ${tenDq.n}; estimated ${share(report.tenDqEstimated)}`,
    `  10Dq without anchors      median error ${percent(tenDqNotAnchored.medianAbsolute)}, 90th percentile ${percent(tenDqNotAnchored.percentile90Absolute)}, n ${tenDqNotAnchored.n}`,
    `  B                         median error ${percent(racahB.medianAbsolute)}, 90th percentile ${percent(racahB.percentile90Absolute)}, n ${racahB.n}`,
    `  spin state right          ${share(report.spinRight)} neither near crossover nor badged; ${share(report.spinRightOfAll)} of all; Brier score ${report.brier === null ? '-' : report.brier.toFixed(3)}`,
    `  crossover recognised      ${share(report.crossoversSeen)} (near crossover or badged)`,
    `  bands inside 68 % range   ${share(report.bandsWithin68)}`,
    `  bands inside 95 % range   ${share(report.bandsWithin95)}`,
    `  d-d bands not estimated   ${share(report.notEstimated)}`,
    `  charge transfer in 4000   ${share(report.chargeTransferWithin4000)}`,
    `  hue within 30° or cloud   ${share(report.hueRight)}`,
    `  moment inside its range   ${share(report.momentsInside)}`,
  ];
}
