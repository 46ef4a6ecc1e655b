'use client';

import { createContext, type ReactNode, useContext } from 'react';
import type { StudyFile } from '@/lib/shared/study-types';

type Source = () => StudyFile | null;

const SourceContext = createContext<Source>(() => null);

interface FigureSourceProps {
  /** The study that the figures below show; asked for when one of them is saved. */
  study: StudyFile | Source;
  children: ReactNode;
}

/** Tells figures whose numbers they show, so that their files can carry the study's hash. */
export function FigureSource({ study, children }: FigureSourceProps) {
  return <SourceContext value={typeof study === 'function' ? study : () => study}>{children}</SourceContext>;
}

export function useFigureSource(): Source {
  return useContext(SourceContext);
}
