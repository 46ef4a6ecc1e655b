'use client';

import { type ReactNode, useCallback } from 'react';
import { FigureSource } from '@/components/figures/figure-source';
import { useExploreStore } from './explore-context';

/** The study that the bench's figures show: the one that stands there, or the last that could be drawn. */
export function BenchSource({ children }: { children: ReactNode }) {
  const store = useExploreStore();
  const shown = useCallback(() => {
    const { study, picture, faults, computing } = store.getState();
    if (picture === null) return null;
    return picture.settled && !computing && faults.length === 0 ? study : picture.study;
  }, [store]);
  return <FigureSource study={shown}>{children}</FigureSource>;
}
