'use client';

import { useEffect } from 'react';
import { encodeStudy, LONGEST_ADDRESS } from '@/lib/shared/encode-study';
import { useExplore } from './explore-context';

const REST_MS = 250;

/** Keeps the study in the page's address. Browsers limit how often an address may change, so it waits for rest. */
export function Address() {
  const study = useExplore((state) => state.study);
  const query = encodeStudy(study);
  const fits = query.length <= LONGEST_ADDRESS;
  useEffect(() => {
    if (!fits) return;
    const timer = setTimeout(() => {
      const address = `${location.pathname}?${query}`;
      if (`${location.pathname}${location.search}` !== address) history.replaceState(null, '', address);
    }, REST_MS);
    return () => clearTimeout(timer);
  }, [query, fits]);
  if (fits) return null;
  return (
    <p role="status" className="mt-2 text-muted">
      This study is too long for an address: share it as a file.
    </p>
  );
}
