import type { NextConfig } from 'next';

/**
 * Headers for every response, static files included. COOP and COEP make the pages cross-origin isolated, which is
 * what gives the worker a SharedArrayBuffer; worker scripts must carry COEP themselves or they do not load.
 * The nonce policy of pages is set per request in proxy.ts.
 */
const everywhere = [
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Embedder-Policy', value: 'require-corp' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=()' },
];

// A worker started from a script obeys the policy that came with the script, not the page's.
const scripts = "default-src 'none'; script-src 'self'; connect-src 'self'; worker-src 'self' blob:";
const data = "default-src 'none'; frame-ancestors 'none'";

const nextConfig: NextConfig = {
  typedRoutes: true,
  poweredByHeader: false,
  agentRules: false,
  // `npm run check` checks the types, those of the tests too; a start need not do it again.
  typescript: { ignoreBuildErrors: true },
  // Another lock file in a folder above must not move the project's root.
  turbopack: { root: import.meta.dirname },
  async headers() {
    return [
      { source: '/:path*', headers: everywhere },
      { source: '/_next/static/:path*', headers: [{ key: 'Content-Security-Policy', value: scripts }] },
      { source: '/api/:path*', headers: [{ key: 'Content-Security-Policy', value: data }] },
    ];
  },
};

export default nextConfig;
