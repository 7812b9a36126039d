import type { NextConfig } from 'next';

const config: NextConfig = {
  // These load native code or optional drivers by name, which a bundler can't follow.
  serverExternalPackages: ['sequelize', 'mariadb', '@node-rs/argon2', 'umzug', 'sharp', 'pino'],
  poweredByHeader: false,
  reactStrictMode: true,
  turbopack: { root: import.meta.dirname },
};

export default config;
