/** @type {import('prettier').Config} */
const config = {
  singleQuote: true,
  semi: true,
  printWidth: 100,
  trailingComma: 'all',
  plugins: ['prettier-plugin-tailwindcss'],
  tailwindConfig: './tailwind.config.ts',
};

export default config;
