import { scaleLinear } from 'd3-scale';
import type { Eigenvalue } from '@/lib/shared/study-types';

export interface SpectrumFigureProps {
  noisy: Eigenvalue[];
  without: Eigenvalue[];
  title: string;
  size: number;
  /** Index of the chosen one among `noisy`. */
  chosen?: number | null;
  /** Where eigenvalues with noise go as the noise level changes. */
  trails?: readonly { points: readonly { re: number; im: number }[] }[];
}

export const SPECTRUM_MARGIN = 20;

export function spectrumScale(size: number) {
  return scaleLinear([-1, 1], [SPECTRUM_MARGIN, size - SPECTRUM_MARGIN]);
}

/** Marks are told apart by their place in the list: each then moves in place while something is dragged. */
function withKeys(eigenvalues: Eigenvalue[]) {
  return eigenvalues.map((eigenvalue, place) => ({ ...eigenvalue, key: String(place) }));
}

/** Eigenvalues in the unit circle: filled dots with noise, open diamonds without, faint where unresolved. */
export function SpectrumFigure({ noisy, without, title, size, chosen, trails = [] }: SpectrumFigureProps) {
  const along = spectrumScale(size);
  const x = (re: number) => Math.round(along(re) * 10) / 10;
  const y = (im: number) => Math.round(along(-im) * 10) / 10;
  const middle = size / 2;
  const unit = middle - SPECTRUM_MARGIN;
  const marked = chosen === null || chosen === undefined ? undefined : noisy[chosen];
  return (
    <svg
      viewBox={`0 0 ${size} ${size}`}
      width={size}
      height={size}
      className="block max-w-full"
      role="img"
      aria-label={title}
      fill="none"
    >
      <title>{title}</title>
      <circle cx={middle} cy={middle} r={unit} className="fill-raised stroke-rule" />
      {[0.25, 0.5, 0.75].map((radius) => (
        <circle key={radius} cx={middle} cy={middle} r={unit * radius} className="stroke-rule-soft" />
      ))}
      <path
        d={`M${SPECTRUM_MARGIN} ${middle}H${size - SPECTRUM_MARGIN}M${middle} ${SPECTRUM_MARGIN}V${size - SPECTRUM_MARGIN}`}
        className="stroke-rule-soft"
      />
      <g className="fill-muted figures text-[11px]">
        {[0.25, 0.5, 0.75].map((radius) => (
          <text key={radius} x={middle + 4} y={middle - unit * radius - 4}>
            {radius}
          </text>
        ))}
        <text x={size - SPECTRUM_MARGIN - 6} y={middle + 17} textAnchor="end" className="math text-[13px]">
          Re <tspan fontStyle="italic">λ</tspan>
        </text>
        <text x={middle} y={SPECTRUM_MARGIN - 6} textAnchor="middle" className="math text-[13px]">
          Im <tspan fontStyle="italic">λ</tspan>
        </text>
      </g>
      <g data-series="spectrum-trails" className="stroke-rain" strokeWidth="1" strokeLinejoin="round" opacity="0.6">
        {trails.map(({ points }, place) => (
          <path
            // biome-ignore lint/suspicious/noArrayIndexKey: a trail is told apart by its eigenvalue's place, as dots are
            key={place}
            d={`M${points.map(({ re, im }) => `${x(re)} ${y(im)}`).join('L')}`}
          />
        ))}
      </g>
      <g data-series="spectrum-without" className="stroke-rust" strokeWidth="1.2">
        {withKeys(without).map(({ key, re, im, resolved }) => (
          <path
            key={key}
            d={`M${x(re)} ${y(im) - 4.5}l4.5 4.5l-4.5 4.5l-4.5 -4.5z`}
            opacity={resolved === false ? 0.35 : 1}
          />
        ))}
      </g>
      <g data-series="spectrum-with" className="fill-rain">
        {withKeys(noisy).map(({ key, re, im, resolved }) => (
          <circle key={key} cx={x(re)} cy={y(im)} r="5" opacity={resolved === false ? 0.35 : 1} />
        ))}
      </g>
      {marked && <circle cx={x(marked.re)} cy={y(marked.im)} r="9" className="stroke-ink" strokeWidth="1.2" />}
    </svg>
  );
}
