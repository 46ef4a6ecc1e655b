'use client';

import { createContext, type ReactNode, useContext, useEffect, useState } from 'react';
import { useStore } from 'zustand';
import { browserKernelHost } from '@/lib/client/browser-kernel-host';
import type { ExploreState } from '@/lib/client/explore-core';
import {
  createExploreStore,
  type ExploreActions,
  type ExploreBeginning,
  type ExploreStore,
} from '@/lib/client/explore-store';
import { createSideStore, type SideActions, type SideState, type SideStore } from '@/lib/client/side-store';
import type { SystemEntry } from '@/lib/shared/system-entry';

const StoreContext = createContext<ExploreStore | null>(null);
const SideContext = createContext<SideStore | null>(null);
const CatalogueContext = createContext<SystemEntry[]>([]);

const timers = {
  after(ms: number, run: () => void) {
    const timer = setTimeout(run, ms);
    return () => clearTimeout(timer);
  },
};

interface ExploreProviderProps {
  beginning: ExploreBeginning;
  catalogue: SystemEntry[];
  children: ReactNode;
}

export function ExploreProvider({ beginning, catalogue, children }: ExploreProviderProps) {
  const [store] = useState(() => createExploreStore(beginning, browserKernelHost, timers));
  const [side] = useState(() => createSideStore(store, browserKernelHost, timers));
  useEffect(() => {
    store.getState().start();
    const end = side.getState().start();
    return () => {
      end();
      store.getState().dispose();
    };
  }, [store, side]);
  return (
    <CatalogueContext value={catalogue}>
      <StoreContext value={store}>
        <SideContext value={side}>{children}</SideContext>
      </StoreContext>
    </CatalogueContext>
  );
}

export function useExploreStore(): ExploreStore {
  const store = useContext(StoreContext);
  if (store === null) throw new Error('the bench is used outside its provider');
  return store;
}

export function useExplore<T>(select: (state: ExploreState & ExploreActions) => T): T {
  return useStore(useExploreStore(), select);
}

/** What stands beside the picture: rail, strip, trails, eigenfunction. */
export function useSide<T>(select: (state: SideState & SideActions) => T): T {
  const store = useContext(SideContext);
  if (store === null) throw new Error('the bench is used outside its provider');
  return useStore(store, select);
}

/** The catalogue's entry for a study's system; undefined for a typed formula. */
export function useSystem(): SystemEntry | undefined {
  const id = useExplore((state) => state.study.system.id);
  return useContext(CatalogueContext).find((entry) => entry.id === id);
}

export function useCatalogue(): SystemEntry[] {
  return useContext(CatalogueContext);
}
