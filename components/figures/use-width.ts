'use client';

import { type RefObject, useLayoutEffect, useRef, useState } from 'react';

/**
 * The width that a figure has on screen. The server draws at `first`; the frame's height is fixed, so that measuring
 * moves nothing around it.
 */
export function useWidth<T extends HTMLElement>(first: number): [RefObject<T | null>, number] {
  const ref = useRef<T>(null);
  const [width, setWidth] = useState(first);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null) return;
    setWidth(Math.round(element.clientWidth));
    const observer = new ResizeObserver(([entry]) => setWidth(Math.round(entry.contentRect.width)));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
