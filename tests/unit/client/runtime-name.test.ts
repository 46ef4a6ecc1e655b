import { expect, it } from 'vitest';
import { runtimeName } from '@/lib/client/runtime-name';

// User agents as the browsers' own documentation gives their form (RFC 9110, section 10.1.5, for the syntax).
it.each([
  [
    'Mozilla/5.0 (X11; Linux x86_64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/156.0.0.0 Safari/537.36',
    'Chromium 156',
  ],
  [
    'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Safari/537.36 Edg/140.0.0.0',
    'Edge 140',
  ],
  ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox 140'],
  [
    'Mozilla/5.0 (Macintosh; Intel Mac OS X 10_15_7) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.0 Safari/605.1.15',
    'Safari 18',
  ],
  ['curl/8', 'a browser'],
])('%s is %s', (agent, name) => {
  expect(runtimeName(agent)).toBe(name);
});
