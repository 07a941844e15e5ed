import coreWebVitals from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

const config = [
  { ignores: ['.next/**', 'node_modules/**', 'data/**', 'test-results/**', 'playwright-report/**', 'next-env.d.ts'] },
  ...coreWebVitals,
  ...typescript,
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      // An inline style is refused by the Content-Security-Policy when the server renders it.
      'react/forbid-dom-props': ['error', { forbid: ['style'] }],
    },
  },
  // A mail has no stylesheet to ask: inline is where its styles are.
  { files: ['emails/**'], rules: { 'react/forbid-dom-props': 'off' } },
]

export default config
