import { useState } from 'react';
import { useRouter } from '../../app/router/RouterContext';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { LevelDiagram } from '../../plots';
import { ConfigurationTable } from './ConfigurationTable';
import { DiagramControls } from './DiagramControls';
import { readDiagramItem } from './diagramSettings';
import { GroundNote } from './GroundNote';
import { LevelTable } from './LevelTable';
import { useDiagram } from './useDiagram';
import './DiagramView.css';

/** Level diagrams of any d ion, for looking and for teaching; a complex sheet shows its own. */
export default function DiagramView() {
  const { address } = useRouter();
  // An address with other settings starts afresh.
  return <Explorer key={address.item ?? ''} item={address.item} />;
}

function Explorer({ item }: { readonly item: string | null }) {
  const [settings, setSettings] = useState(() => readDiagramItem(item));
  const { settings: drawn, lines, levels, crossovers } = useDiagram(settings);
  const perB = drawn.axes === 'over-B' ? 1 : drawn.B;
  return (
    <>
      <ViewHeader
        title="Level diagrams"
        summary="Every level of a d ion in an octahedral or tetrahedral field, computed from 10Dq, B and C."
      />
      <div className="diagram">
        <DiagramControls settings={settings} onChange={setSettings} />
        <div className="diagram-main stack">
          <div className="panel">
            <LevelDiagram
              title={`Levels of d${drawn.dElectrons}, ${drawn.geometry}, C/B ${Number(drawn.cOverB.toFixed(2))}`}
              axes={drawn.axes}
              lines={lines}
              crossovers={crossovers.map((one) => ({ ...one, x: one.x * perB }))}
              candidate={{
                x: drawn.axes === 'over-B' ? drawn.tenDq / drawn.B : drawn.tenDq,
                sigma: null,
                name: 'chosen field',
              }}
              height={520}
            />
          </div>
          <GroundNote settings={drawn} ground={levels[0]} crossovers={crossovers} />
          <LevelTable levels={levels} geometry={drawn.geometry} />
          <ConfigurationTable dElectrons={drawn.dElectrons} geometry={drawn.geometry} />
        </div>
      </div>
    </>
  );
}
