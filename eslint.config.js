import eslint from '@eslint/js'
import vue from 'eslint-plugin-vue'
import tseslint from 'typescript-eslint'

/** What the pure core may not touch, with the reason shown in the editor. */
const CORE_GLOBALS = [
  'window',
  'document',
  'process',
  'performance',
  'console',
  'Date',
  'setTimeout',
  'fetch',
]

/** Functions whose last digits the language leaves to each engine. */
const ENGINE_FUNCTIONS =
  'sin cos tan asin acos atan atan2 sinh cosh tanh exp expm1 log log10 log1p log2 pow cbrt hypot'.split(' ')

export default tseslint.config(
  { ignores: ['out/', 'node_modules/', 'coverage/', 'test-output/'] },
  eslint.configs.recommended,
  ...tseslint.configs.recommended,
  ...vue.configs['flat/essential'],
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: tseslint.parser } },
  },
  {
    rules: {
      'no-undef': 'off', // the compiler knows
      'no-irregular-whitespace': ['error', { skipStrings: true, skipTemplates: true }],
      eqeqeq: 'error',
      'prefer-const': 'error',
      '@typescript-eslint/no-non-null-assertion': 'off',
      'vue/multi-word-component-names': 'off',
    },
  },
  {
    files: ['src/core/**/*.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        { selector: 'BinaryExpression[operator="**"]', message: 'Use power of core/numerics/elementary.' },
        {
          selector: 'AssignmentExpression[operator="**="]',
          message: 'Use power of core/numerics/elementary.',
        },
      ],
      'no-restricted-globals': [
        'error',
        ...CORE_GLOBALS.map((name) => ({
          name,
          message: 'The core is pure: no clock, no screen, no machine.',
        })),
      ],
      'no-restricted-properties': [
        'error',
        {
          object: 'Math',
          property: 'random',
          message: 'The core is pure: the same input gives the same result.',
        },
        ...ENGINE_FUNCTIONS.map((property) => ({
          object: 'Math',
          property,
          message: 'Engines differ in the last digits: take it from core/numerics/elementary.',
        })),
      ],
    },
  },
)
