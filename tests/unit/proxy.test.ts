import { NextRequest } from 'next/server';
import { describe, expect, it } from 'vitest';
import { proxy } from '@/proxy';

function policy(): Map<string, string> {
  const header = proxy(new NextRequest('http://127.0.0.1/explore')).headers.get('Content-Security-Policy') ?? '';
  return new Map(header.split('; ').map((part) => [part.split(' ')[0], part]));
}

describe('the content security policy of a page', () => {
  it('runs no script but our own: no eval, no inline script without the nonce', () => {
    const rules = policy();
    expect(rules.get('script-src')).toMatch(/^script-src 'self' 'nonce-[0-9a-f]{32}'$/);
    expect(rules.get('style-src')).toMatch(/^style-src 'self' 'nonce-[0-9a-f]{32}'$/);
    expect(rules.get('default-src')).toBe("default-src 'self'");
    for (const name of ['object-src', 'base-uri', 'frame-src', 'frame-ancestors'])
      expect(rules.get(name)).toBe(`${name} 'none'`);
  });

  it('gives every request a nonce of its own', () => {
    expect(policy().get('script-src')).not.toBe(policy().get('script-src'));
  });
});
