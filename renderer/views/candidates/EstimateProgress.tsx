import { useEffect, useState } from 'react';
import type { Estimates } from '../../app/session/estimates';
import { useVersion } from '../../app/session/observable';
import { ErrorPanel, Progress } from '../../parts';

/** Shown once it takes longer than a blink. */
const patience_ms = 500;

export function EstimateProgress({ estimates }: { readonly estimates: Estimates }) {
  useVersion(estimates);
  const { progress, error } = estimates;
  const late = useLate(progress !== null);
  if (error !== null) {
    return (
      <ErrorPanel
        title="Not everything could be estimated"
        problems={[
          {
            code: 'not-estimated',
            field: '',
            message: error,
            remedy: 'What you entered is safe. Reload the window to try again.',
          },
        ]}
      />
    );
  }
  if (progress === null || !late) return null;
  return <Progress label="Estimating candidates" done={progress.done} total={progress.total} />;
}

function useLate(running: boolean): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    if (!running) return;
    const timer = setTimeout(() => setLate(true), patience_ms);
    return () => {
      clearTimeout(timer);
      setLate(false);
    };
  }, [running]);
  return running && late;
}
