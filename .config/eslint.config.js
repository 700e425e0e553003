import { defineConfig, globalIgnores } from 'eslint/config';
import tseslint from 'typescript-eslint';

/** Rules that find mistakes; how code looks is Prettier's business, who may import whom that of test/house. */
const inexact =
  'exp log log10 log2 log1p expm1 sin cos tan asin acos atan atan2 sinh cosh tanh asinh acosh atanh cbrt pow'.split(
    ' ',
  );

export default defineConfig(
  globalIgnores(['dist/', '.astro/', 'coverage/']),
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  {
    files: ['**/*.{ts,js,mjs}'],
    extends: [tseslint.configs.strictTypeChecked],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      eqeqeq: 'error',
      'no-console': ['error', { allow: ['error'] }],
      'no-control-regex': 'error',
      'no-duplicate-imports': ['error', { allowSeparateTypeImports: true }],
      'no-param-reassign': 'error',
      'object-shorthand': ['error', 'properties'],
      'prefer-const': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      // Numbers stand in messages everywhere here, and they are formatted on purpose.
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      // `array[i]!` in a loop over the array's own length is the plain way to say it under noUncheckedIndexedAccess.
      '@typescript-eslint/no-non-null-assertion': 'off',
      // ... and it stays where undefined would be taken too.
      '@typescript-eslint/no-unnecessary-type-assertion': 'off',
      // An arrow that calls one procedure reads well without braces.
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
    },
  },
  {
    // Lit calls an element's listeners on the element itself.
    files: ['components/**'],
    rules: { '@typescript-eslint/unbound-method': 'off' },
  },
  {
    // The core knows neither a browser nor Node: of a host's globals, only those that every host has.
    files: ['src/**/*.ts'],
    ignores: ['src/cli/**', 'src/workers/**', 'src/pages/**', 'src/layouts/**'],
    languageOptions: {
      parserOptions: { lib: ['es2023'] },
      globals: {
        TextEncoder: 'readonly',
        TextDecoder: 'readonly',
        WebAssembly: 'readonly',
        ReadableStream: 'readonly',
        DecompressionStream: 'readonly',
      },
    },
    rules: {
      'no-undef': 'error',
      // These differ in the last bit between a browser and Node, and with them a report's bytes.
      'no-restricted-properties': [
        'error',
        ...inexact.map((property) => ({ object: 'Math', property, message: 'Use src/quantity/elementary.ts.' })),
      ],
    },
  },
  {
    files: ['test/**'],
    rules: {
      'no-console': 'off',
      // Files read back, pages evaluated and deliberately broken input are of no type.
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    // These don't belong to the program that tsconfig.json describes.
    files: ['**/*.{js,mjs}'],
    extends: [tseslint.configs.disableTypeChecked],
  },
);
