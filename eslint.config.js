import js from '@eslint/js'
import jsxA11y from 'eslint-plugin-jsx-a11y'
import reactHooks from 'eslint-plugin-react-hooks'
import reactRefresh from 'eslint-plugin-react-refresh'
import globals from 'globals'
import tseslint from 'typescript-eslint'

/** Forbids the given import patterns, with the reason a person reads in the lint message. */
const noImport = (...rules) => ({
  'no-restricted-imports': [
    'error',
    { patterns: rules.map(([group, message]) => ({ group, message })) },
  ],
})

const server = ['#server/*', '**/server/**']
const client = ['@/*', '**/src/**']

export default tseslint.config(
  { ignores: ['dist', 'coverage', 'node_modules'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false } },
      ],
      // A unit is a number with a name; this rule does not see through the name, the compiler does.
      '@typescript-eslint/no-unsafe-unary-minus': 'off',
      eqeqeq: ['error', 'always'],
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: noImport(
      [server, 'shared is pure: it never imports the server.'],
      [client, 'shared is pure: it never imports the client.'],
      [
        ['node:*', 'react', 'react-dom', 'konva', 'express', 'knex', 'pg'],
        'shared knows neither Node nor a DOM.',
      ],
    ),
  },
  {
    files: ['server/**/*.ts'],
    rules: noImport([client, 'server and src never import each other, not even for a type.']),
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    extends: [
      jsxA11y.flatConfigs.recommended,
      reactHooks.configs.flat.recommended,
      reactRefresh.configs.vite,
    ],
    languageOptions: { globals: globals.browser },
    rules: noImport([server, 'server and src never import each other, not even for a type.']),
  },
  {
    files: ['migrations/**/*.ts'],
    rules: noImport([
      ['#*', '../*'],
      'A migration imports Knex types only, so it means the same for ever.',
    ]),
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: globals.node } },
)
