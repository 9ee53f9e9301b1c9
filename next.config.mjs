/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  agentRules: false,
  // A test run builds beside a developer's own build without disturbing it.
  distDir: process.env.RAGLAN_DIST_DIR ?? '.next',
  serverExternalPackages: [
    'pg',
    'graphile-worker',
    '@node-rs/argon2',
    'pino',
    'pdf-lib',
    'bwip-js',
    'subset-font',
    '@pdf-lib/fontkit',
  ],
  // `npm run types` checks types, tests included; starting the product does not wait for it.
  typescript: { ignoreBuildErrors: true },
  experimental: {
    // A roster file may weigh 5 MB; the rest is the form around it.
    serverActions: { bodySizeLimit: '6mb' },
  },
  async headers() {
    return [
      {
        source: '/:path*',
        headers: [
          { key: 'X-Content-Type-Options', value: 'nosniff' },
          { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
          { key: 'X-Frame-Options', value: 'DENY' },
          { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
          { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=()' },
          { key: 'Strict-Transport-Security', value: 'max-age=31536000; includeSubDomains' },
        ],
      },
    ];
  },
};

export default config;
