import { type ReactNode } from 'react';
import { Scatter } from 'recharts';
import { markerShape } from './markers';
import { grouped, type Pair } from './pairs';

interface PairScatterProps {
  readonly pairs: readonly Pair[];
  /** Place of a pair, with whatever error bars and labels need. */
  readonly place: (pair: Pair) => { readonly x: number; readonly y: number };
  /** Error bars or labels on every point. */
  readonly children?: ReactNode;
}

/** All pairs, one marker shape per group. */
export function PairScatter({ pairs, place, children }: PairScatterProps) {
  return [...grouped(pairs)].map(([name, members], group) => (
    <Scatter
      key={name}
      name={name}
      isAnimationActive={false}
      shape={markerShape(group)}
      data={members.map(place)}
    >
      {children}
    </Scatter>
  ));
}
