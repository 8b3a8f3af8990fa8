/** One stop of the tour: where it is and what to look at there. */
export interface TourStep {
  /** View in the demo project, or of the workbench where `project` is false. */
  readonly view: string;
  readonly project: boolean;
  readonly title: string;
  readonly text: string;
}

export const tourSteps: readonly TourStep[] = [
  {
    view: 'candidates',
    project: true,
    title: 'The candidates',
    text: 'Each row is a complex nobody here has made: the light that passes, the colour seen, spin state, first band, each with its range. Type “450-600 nm” into the filter, or press a heading to sort. Enter opens a row.',
  },
  {
    view: 'search',
    project: true,
    title: 'From a wish to ligands',
    text: 'Say what it should do, which metals and ligands are allowed, and every combination is ranked by its chance. Whatever was left out can tell why.',
  },
  {
    view: 'entry',
    project: true,
    title: 'One more complex',
    text: 'Type a formula such as [Co(en)2Cl2]+ or choose metal and ligands. The estimate follows as you go.',
  },
  {
    view: 'record',
    project: true,
    title: 'The lab record',
    text: 'Drop a spectrum here once there is one. The prediction that stood before is frozen first, so that the comparison is honest.',
  },
  {
    view: 'agreement',
    project: true,
    title: 'How good it has been',
    text: 'Measured beside predicted, in figures and plots. From enough pairs the parameters can learn, and you can take that back.',
  },
  {
    view: 'reports',
    project: true,
    title: 'One page to hand over',
    text: 'A card, a comparison, an order list: with ranges, cautions and the parameters they were made with. Ctrl+K finds everything, “?” lists the keys. That was the tour.',
  },
];
