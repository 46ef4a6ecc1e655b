'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextButton } from '@/components/ui/text-button';
import { fileName, saveFile } from '@/lib/client/save-file';
import { formatEntry } from '@/lib/shared/format-number';
import { useExplore } from './explore-context';
import { pinsOf, withPin, withPinSweep } from './pins';

interface RailPinsProps {
  sigma: number;
  pins: readonly number[];
  onPins(pins: number[]): void;
}

/** Noise levels to come back to; together they make a sweep of the study. */
export function RailPins({ sigma, pins, onPins }: RailPinsProps) {
  const edit = useExplore((state) => state.edit);
  const study = useExplore((state) => state.study);
  const [said, setSaid] = useState('');
  const swept = pinsOf(study);
  const same = swept.length === pins.length && swept.every((level, i) => level === pins[i]);
  const sweep = () => {
    edit((current) => withPinSweep(current, pins));
    setSaid(pins.length > 0 ? `The study sweeps ${pins.length} noise levels` : 'The study has no sweep');
  };
  const save = () =>
    saveFile(fileName(study.title ?? '', 'json'), 'application/json', `${JSON.stringify(study, null, 2)}\n`);
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <Button low onClick={() => onPins(withPin(pins, sigma))} disabled={pins.includes(sigma)}>
        Pin this <span className="math italic">σ</span>
      </Button>
      {pins.length > 0 && (
        <ul className="flex flex-wrap gap-x-3" aria-label="Pinned noise levels">
          {pins.map((pin) => (
            <li key={pin} className="flex items-baseline gap-1">
              <TextButton
                className="figures text-ink"
                onClick={() => edit((current) => ({ ...current, noise: { ...current.noise, sigma: pin } }))}
                aria-label={`Go to sigma ${formatEntry(pin)}`}
              >
                {formatEntry(pin)}
              </TextButton>
              <TextButton
                onClick={() => onPins(pins.filter((other) => other !== pin))}
                aria-label={`Unpin ${formatEntry(pin)}`}
              >
                unpin
              </TextButton>
            </li>
          ))}
        </ul>
      )}
      {(pins.length > 0 || swept.length > 0) && !same && (
        <Button low onClick={sweep}>
          {pins.length > 0 ? 'Sweep the pins' : 'Take the sweep out'}
        </Button>
      )}
      {same && pins.length > 0 && (
        <TextButton onClick={save} aria-label="Save the study file with its sweep">
          Save study file
        </TextButton>
      )}
      <span role="status" className="text-muted">
        {same ? said : ''}
      </span>
    </div>
  );
}
