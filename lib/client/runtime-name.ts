const engines: [RegExp, string][] = [
  [/Firefox\/(\d+)/, 'Firefox'],
  [/Edg\/(\d+)/, 'Edge'],
  [/Chrom(?:e|ium)\/(\d+)/, 'Chromium'],
  [/Version\/(\d+)[^ ]* (?:Mobile\S* )?Safari/, 'Safari'],
];

/** "Chromium 156": what a result says of where it was computed. Other runtimes differ in the last digits of exp and log. */
export function runtimeName(userAgent: string): string {
  for (const [pattern, name] of engines) {
    const version = pattern.exec(userAgent)?.[1];
    if (version) return `${name} ${version}`;
  }
  return 'a browser';
}
