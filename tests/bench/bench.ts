import { execFileSync } from 'node:child_process';
import { benchCases, formulaPair } from './cases';

interface Figure {
  case: string;
  seconds: number;
  error: number;
  /** formula-ratio only: typed formula against a hand-written loop */
  ratio?: number;
}

interface PeerFigure {
  case: string;
  seconds: number;
  error: number;
  how: string;
}

const USAGE = 'usage: npm run -s bench -- [--json] [--peer] [--only CASE]';

/**
 * Times the kernel: medians with a warm JIT, set-up included where a case says so, error bars off.
 *
 * @param argv --json: one JSON line; --peer: NumPy and SciPy beside it, at equal error; --only: one case
 * @returns exit status; a timing never makes it fail
 */
export async function main(argv: readonly string[]): Promise<number> {
  const onlyAt = argv.indexOf('--only');
  const only = onlyAt >= 0 ? argv[onlyAt + 1] : null;
  const known = ['--json', '--peer', '--only', only];
  if (argv.some((a) => !known.includes(a)) || only === undefined) {
    process.stderr.write(`${USAGE}\n`);
    return 2;
  }
  const figures: Figure[] = [];
  for (const c of benchCases()) {
    if (only && c.name !== only) continue;
    const { seconds, result } = median(c.work, c.loops);
    figures.push({ case: c.name, seconds, error: c.error(result) });
  }
  if (!only || only === 'formula-ratio') figures.push(formulaRatio());
  const peers = argv.includes('--peer') ? runPeer() : [];
  if (argv.includes('--json'))
    process.stdout.write(`${JSON.stringify(peers.length > 0 ? { smirr: figures, peer: peers } : figures)}\n`);
  else print(figures, peers);
  return 0;
}

/** Median seconds of one call: the work is warmed up first, then timed at least nine times or for two seconds. */
function median(work: () => unknown, loops: number): { seconds: number; result: unknown } {
  let result: unknown;
  const once = () => {
    const begun = performance.now();
    for (let i = 0; i < loops; i++) result = work();
    return (performance.now() - begun) / 1000 / loops;
  };
  for (let i = 0; i < 5; i++) once();
  const times: number[] = [];
  const begun = performance.now();
  while (times.length < 9 || (performance.now() - begun < 2000 && times.length < 101)) times.push(once());
  times.sort((a, b) => a - b);
  return { seconds: times[times.length >> 1], result };
}

/** Times the two evaluations in turn, so that a busy machine slows both alike. */
function formulaRatio(): Figure {
  const { formula, byHand, difference } = formulaPair();
  const time = (f: () => void) => {
    const begun = performance.now();
    for (let i = 0; i < 20; i++) f();
    return (performance.now() - begun) / 20 / 1000;
  };
  for (let i = 0; i < 10; i++) {
    time(formula);
    time(byHand);
  }
  const rounds = Array.from({ length: 31 }, () => {
    const typed = time(formula);
    return { typed, ratio: typed / time(byHand) };
  }).sort((a, b) => a.ratio - b.ratio);
  const { typed, ratio } = rounds[rounds.length >> 1];
  return { case: 'formula-ratio', seconds: typed, ratio, error: difference() };
}

/** The same questions by NumPy and SciPy on Debian's Python. */
function runPeer(): PeerFigure[] {
  const text = execFileSync('/usr/bin/python3', ['tests/bench/peer.py', '--json'], {
    encoding: 'utf8',
    maxBuffer: 1e7,
  });
  return JSON.parse(text) as PeerFigure[];
}

function print(figures: Figure[], peers: PeerFigure[]): void {
  const aims = new Map(benchCases().map((c) => [c.name, c]));
  const ms = (s: number) => `${(1000 * s).toPrecision(3)} ms`.padStart(11);
  for (const f of figures) {
    const peer = peers.filter((p) => p.case === f.case);
    const what = f.ratio === undefined ? ms(f.seconds) : `${f.ratio.toFixed(2)} times`.padStart(11);
    process.stdout.write(
      `${f.case.padEnd(18)} ${what}  error ${f.error.toExponential(1)}  ${aims.get(f.case)?.says ?? 'typed formula against a hand-written loop'}\n`,
    );
    for (const p of peer)
      process.stdout.write(`${''.padEnd(18)} ${ms(p.seconds)}  error ${p.error.toExponential(1)}  peer: ${p.how}\n`);
  }
}
