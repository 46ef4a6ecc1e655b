import type { SystemEntry } from '@/lib/shared/system-entry';

/** What the catalogue knows of a system: what it models, values from the literature with their sources. */
export function SystemAbout({ system }: { system: SystemEntry }) {
  return (
    <div className="space-y-2 text-[0.8125rem]">
      <p className="text-sm">{system.summary}</p>
      <ul className="space-y-1.5">
        {system.known.map(({ quantity, holdsFor, value, source }) => (
          <li key={`${quantity} ${holdsFor}`}>
            {quantity}
            {holdsFor && ` (${holdsFor})`}: <span className="figures break-words">{value}</span>
            <span className="block text-muted">{source}</span>
          </li>
        ))}
      </ul>
      <p className="text-muted">{system.citation}</p>
    </div>
  );
}
