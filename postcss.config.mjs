/** PostCSS: Tailwind, and nothing else. */
const config = { plugins: { '@tailwindcss/postcss': {} } };

export default config;
