import { useEffect, useRef, useState, type RefObject } from 'react';

/** Where nothing has been laid out yet (a first paint, a test). */
const fallback = 640;

/** Width of an element in CSS pixels, followed as the window, the zoom or the text size changes. */
export function usePlotWidth(): readonly [RefObject<HTMLDivElement | null>, number] {
  const element = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(fallback);
  useEffect(() => {
    const node = element.current;
    if (!node) return;
    const measure = (): void => {
      if (node.clientWidth > 0) setWidth(Math.max(240, node.clientWidth));
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(node);
    return () => observer.disconnect();
  }, []);
  return [element, width];
}
