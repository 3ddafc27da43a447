import next from 'eslint-config-next';
import tseslint from 'typescript-eslint';
import { boundaries } from './scripts/boundaries.mjs';

export default tseslint.config(
  { ignores: ['.next*/**', 'node_modules/**', 'drizzle/**', '.local/**', '.test/**', 'next-env.d.ts'] },
  ...next,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommended],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
    },
  },
  ...boundaries,
);
