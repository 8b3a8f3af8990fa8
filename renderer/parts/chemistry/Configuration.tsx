import { type CubicGeometry } from '../../../core/dshell/types';
import './TermSymbol.css';

interface ConfigurationProps {
  /** Electrons in t2(g) and e(g). */
  readonly t2: number;
  readonly e: number;
  readonly geometry: CubicGeometry;
}

const written = /^t2g?\^?(\d) eg?\^?(\d)$/;

/** A configuration as the core writes it, `t2g2 eg1`, in type; other text stays as it is. */
export function ConfigurationLabel({ text }: { readonly text: string }) {
  const match = written.exec(text);
  if (!match) return <span>{text}</span>;
  const geometry = text.startsWith('t2g') ? 'octahedral' : 'tetrahedral';
  return <Configuration t2={Number(match[1])} e={Number(match[2])} geometry={geometry} />;
}

const counts = ['none', 'one', 'two', 'three', 'four', 'five', 'six'];

/** A strong-field configuration in type, the lower orbitals first: t₂g⁴e_g² in an octahedron, e²t₂⁴ in a tetrahedron. */
export function Configuration({ t2, e, geometry }: ConfigurationProps) {
  const g = geometry === 'octahedral' ? 'g' : '';
  const shells = [
    { letter: 't', subscript: `2${g}`, electrons: t2, spoken: `t two ${g}` },
    { letter: 'e', subscript: g, electrons: e, spoken: `e ${g}` },
  ].filter(({ electrons }) => electrons > 0);
  if (geometry === 'tetrahedral') shells.reverse();
  return (
    <span className="term-symbol">
      <span aria-hidden="true">
        {shells.map(({ letter, subscript, electrons }) => (
          <span key={letter}>
            {letter}
            <sub>{subscript}</sub>
            <sup>{electrons}</sup>
          </span>
        ))}
      </span>
      <span className="visually-hidden">
        {shells.map(({ spoken, electrons }) => `${spoken.trim()} ${counts[electrons]}`).join(', ')}
      </span>
    </span>
  );
}
