import { describe, expect, it } from 'vitest';
import { type CommandHost, main } from '@/kernels/cli';

const study = {
  format: 'smirr-study',
  version: 1,
  system: { type: 'map', id: 'logistic' },
  noise: { kind: 'gaussian', sigma: 0.1 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: { exit: {} } as Record<string, unknown>,
};

function command(argv: string[], file: unknown = study, more: Partial<CommandHost> = {}) {
  const said = { out: '', err: '', files: {} as Record<string, string> };
  let clock = 0;
  const status = main(argv, {
    readFile: (path) => {
      if (path !== 'study.json') throw new Error(`no such file: ${path}`);
      return typeof file === 'string' ? file : JSON.stringify(file);
    },
    writeFile: (path, text) => {
      said.files[path] = text;
    },
    stdout: (text) => {
      said.out += text;
    },
    stderr: (text) => {
      said.err += text;
    },
    isTerminal: false,
    runtime: 'node 20',
    now: () => (clock += 200),
    ...more,
  });
  return { status, ...said };
}

describe('the headless command', () => {
  it('prints the result as JSON and nothing else', () => {
    const { status, out, err } = command(['study.json']);
    expect({ status, err }).toEqual({ status: 0, err: '' });
    expect(JSON.parse(out)).toMatchObject({ format: 'smirr-result', runtime: 'node 20' });
    expect(out.endsWith('\n')).toBe(true);
  });

  it.each([
    ['before', ['--out', 'r.json', 'study.json']],
    ['behind', ['study.json', '--out', 'r.json']],
  ])('writes to --out given %s the file instead', (_, argv) => {
    const { status, out, files } = command(argv);
    expect({ status, out }).toEqual({ status: 0, out: '' });
    expect(JSON.parse(files['r.json']).cases).toHaveLength(1);
  });

  it('prints the schema of the study file', () => {
    const { status, out } = command(['--schema']);
    expect(status).toBe(0);
    const schema = JSON.parse(out);
    expect(Object.keys(schema.properties)).toEqual(
      expect.arrayContaining(['format', 'system', 'noise', 'domain', 'ask', 'sweep']),
    );
    expect(schema.required).not.toContain('title');
  });

  it('ends with 3 where something could not be had, and says what on standard error', () => {
    const { status, out, err } = command(['study.json'], {
      ...study,
      domain: [{ from: 0, to: 1, ends: 'reflecting' }],
    });
    expect(status).toBe(3);
    expect(JSON.parse(out).warnings).toHaveLength(1);
    expect(err).toMatch(/^cases\[0\]: .*nothing leaves.*\n$/);
  });

  it.each([[[]], [['a.json', 'b.json']], [['--help']], [['study.json', '--out']], [['study.json', '--verbose']]])(
    'called as %j says how to call it and ends with 2',
    (argv) => {
      const { status, out, err } = command(argv);
      expect({ status, out }).toEqual({ status: 2, out: '' });
      expect(err).toMatch(/usage|cannot be read/);
    },
  );

  it('ends with 2 for a file that cannot be read or is no JSON', () => {
    expect(command(['other.json'])).toMatchObject({
      status: 2,
      out: '',
      err: expect.stringContaining('other.json: cannot be read'),
    });
    expect(command(['study.json'], '{')).toMatchObject({
      status: 2,
      out: '',
      err: expect.stringContaining('is no JSON'),
    });
  });

  it('gives one line per fault, path first', () => {
    const { status, err } = command(['study.json'], {
      ...study,
      noise: { kind: 'gaussian', sigma: -1 },
      grid: { points: 3 },
    });
    expect(status).toBe(2);
    const lines = err.trimEnd().split('\n');
    expect(lines).toHaveLength(2);
    expect(lines.map((l) => l.split(':')[0]).sort()).toEqual(['grid.points', 'noise.sigma']);
  });

  it('shows progress on a terminal only, and wipes it away', () => {
    const sweep = [{ over: 'noise.sigma', from: 0.05, to: 0.2, count: 8 }];
    expect(command(['study.json'], { ...study, sweep }).err).toBe('');
    const { err, out } = command(['study.json'], { ...study, sweep }, { isTerminal: true });
    expect(err).toMatch(/\[=*\s*\] \d\/8/);
    expect(err.endsWith('\r')).toBe(true);
    expect(JSON.parse(out).cases).toHaveLength(8);
  });
});
