import { defineConfig, globalIgnores } from 'eslint/config';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** `shared/` must give the same bits in every engine, so only exactly rounded Math functions. */
const inexactMath = [
  'acos', 'acosh', 'asin', 'asinh', 'atan', 'atan2', 'atanh', 'cbrt', 'cos', 'cosh', 'exp', 'expm1',
  'hypot', 'log', 'log10', 'log1p', 'log2', 'pow', 'random', 'sin', 'sinh', 'tan', 'tanh',
]; // prettier-ignore

/** The compiler does not look at scripts that run before it is installed. */
const nodeGlobals = [
  'AbortController',
  'clearTimeout',
  'console',
  'performance',
  'process',
  'setTimeout',
  'URL',
];

export default defineConfig(
  globalIgnores(['node_modules/', 'dist/', '.cache/', '.data/']),
  tseslint.configs.strictTypeChecked,
  tseslint.configs.stylisticTypeChecked,
  {
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/consistent-type-definitions': ['error', 'type'],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      // asks for the `!` that the rule above forbids
      '@typescript-eslint/non-nullable-type-assertion-style': 'off',
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      eqeqeq: 'error',
      'func-style': ['error', 'declaration', { allowArrowFunctions: true }],
      'no-console': 'error',
      'no-param-reassign': 'error',
      'prefer-const': 'error',
    },
  },
  {
    // only an interface can be merged with one of a package
    files: ['**/*.d.ts'],
    rules: { '@typescript-eslint/consistent-type-definitions': 'off' },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', 'Date', 'performance', 'process', 'window', 'document'],
      'no-restricted-properties': [
        'error',
        ...inexactMath.map((property) => ({
          object: 'Math',
          property,
          message: 'Engines round it differently: use shared/numerics, or + − × ÷ and √.',
        })),
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "BinaryExpression[operator='**']", message: 'Write the product out.' },
      ],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat['recommended-latest']],
    rules: {
      'react-hooks/exhaustive-deps': 'error',
      // speaks of a compiler that is not used here
      'react-hooks/incompatible-library': 'off',
    },
  },
  {
    files: ['scripts/**'],
    rules: { 'no-console': 'off' },
  },
  {
    files: ['tests/**/*.ts'],
    rules: {
      // `importOriginal<typeof import('…')>()` is how vitest lets a mock keep the rest of a module
      '@typescript-eslint/consistent-type-imports': ['error', { disallowTypeAnnotations: false }],
    },
  },
  {
    files: ['**/*.{js,mjs}'],
    extends: [tseslint.configs.disableTypeChecked],
    languageOptions: {
      globals: Object.fromEntries(nodeGlobals.map((name) => [name, 'readonly'])),
    },
    rules: { 'no-undef': 'error' },
  },
);
