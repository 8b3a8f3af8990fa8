import { useState } from 'react';
import { colourInWords } from '../../../../core/colour';
import { useProject } from '../../../app/session/ProjectSession';
import { TargetDialog } from './TargetDialog';
import { screenColour } from './labColour';
import './target.css';

/** The colour that the project aims at, and the way to set it. */
export function TargetButton() {
  const { project } = useProject();
  const [open, setOpen] = useState(false);
  const lab = project.targetLab;
  return (
    <>
      <button type="button" onClick={() => setOpen(true)}>
        {lab === null ? (
          'Set a target colour…'
        ) : (
          <>
            <span className="target-surround">
              <span className="target-patch" style={{ backgroundColor: screenColour(lab) }} />
            </span>
            Target: {colourInWords(lab)}
          </>
        )}
      </button>
      <TargetDialog open={open} onClose={() => setOpen(false)} />
    </>
  );
}
