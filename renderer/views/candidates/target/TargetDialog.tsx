import { useState } from 'react';
import { colourInWords } from '../../../../core/colour';
import { useProject } from '../../../app/session/ProjectSession';
import { useAction, useStore } from '../../../app/services';
import { Dialog } from '../../../parts';
import { labOfScreenColour, screenColour } from './labColour';
import { LabField } from './LabField';
import './target.css';

interface TargetDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
}

type Lab = [number, number, number];
const startLab: Lab = [60, 30, -25];

/** Sets the colour that distances in the table are measured to. */
export function TargetDialog({ open, onClose }: TargetDialogProps) {
  return (
    <Dialog open={open} title="Target colour" onClose={onClose}>
      <TargetForm onClose={onClose} />
    </Dialog>
  );
}

function TargetForm({ onClose }: Pick<TargetDialogProps, 'onClose'>) {
  const { project } = useProject();
  const store = useStore();
  const act = useAction();
  const [lab, setLab] = useState<Lab>(project.targetLab ?? startLab);
  const save = (targetLab: Lab | null): void => {
    const label =
      targetLab === null ? 'clear the target colour' : `set the target colour to ${colourInWords(targetLab)}`;
    void act(() => store.projects.update(project.id, label, { targetLab })).then(
      (saved) => saved && onClose(),
    );
  };
  return (
    <div className="stack">
      <p className="soft">
        The seen colour of a solution, CIE 1931 observer, D65. The table can then be ranked by the CIEDE2000
        distance to it. Predicted colours are coarse: differences below 10 mean little before a measurement.
      </p>
      <div className="target-pick">
        <span className="target-surround target-surround-large">
          <span className="target-patch" style={{ backgroundColor: screenColour(lab) }} />
        </span>
        <div className="stack">
          <strong>{colourInWords(lab)}</strong>
          <label className="check">
            <input
              type="color"
              value={screenColour(lab)}
              onChange={(event) => setLab(labOfScreenColour(event.currentTarget.value) ?? lab)}
            />
            Pick on the screen
          </label>
        </div>
      </div>
      <div className="target-numbers">
        <LabField
          label="L* (0 to 100)"
          value={lab[0]}
          onChange={(value) => setLab([value, lab[1], lab[2]])}
        />
        <LabField
          label="a* (green to red)"
          value={lab[1]}
          onChange={(value) => setLab([lab[0], value, lab[2]])}
        />
        <LabField
          label="b* (blue to yellow)"
          value={lab[2]}
          onChange={(value) => setLab([lab[0], lab[1], value])}
        />
      </div>
      <div className="target-actions">
        {project.targetLab !== null && (
          <button type="button" onClick={() => save(null)}>
            No target
          </button>
        )}
        <button type="button" className="button-main" onClick={() => save(lab)}>
          Aim at this colour
        </button>
      </div>
    </div>
  );
}
