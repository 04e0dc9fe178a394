import js from '@eslint/js';
import globals from 'globals';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import ts from 'typescript-eslint';

export default ts.config(
  { ignores: ['dist/', '.data/', 'coverage/', 'node_modules/', '**/*.generated.*'] },
  js.configs.recommended,
  {
    languageOptions: { globals: globals.node },
    rules: {
      eqeqeq: ['error', 'always'],
      'no-eval': 'error',
      'no-new-func': 'error',
      'prefer-const': 'error',
      'no-control-regex': 'off',
      'max-lines': ['error', { max: 350 }],
      'max-lines-per-function': ['error', { max: 80, skipComments: true, skipBlankLines: true }],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [ts.configs.recommended],
    languageOptions: { parserOptions: { project: './tsconfig.json', tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'separate-type-imports' }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      // The compiler knows better which names exist.
      'no-undef': 'off',
    },
  },
  {
    // Nothing that a user wrote becomes a statement's text.
    files: ['server/**/*.ts'],
    ignores: ['server/database/**'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'Only server/config reads the environment.' },
      ],
      'no-restricted-imports': ['error', { paths: [{ name: 'node:child_process' }, { name: 'node:vm' }] }],
    },
  },
  { files: ['public/**'], languageOptions: { globals: globals.browser } },
  { files: ['server/config/**'], rules: { 'no-restricted-properties': 'off' } },
  {
    files: ['src/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat.recommended, jsxA11y.flatConfigs.recommended],
    languageOptions: { globals: globals.browser },
    rules: {
      'react-hooks/incompatible-library': 'off',
      // A dialog and the sign-in form may take the keyboard: it is what they were opened for.
      'jsx-a11y/no-autofocus': 'off',
      // Tables that become cards on a narrow screen lose their meaning there without roles of their own.
      'jsx-a11y/no-redundant-roles': 'off',
      'jsx-a11y/no-interactive-element-to-noninteractive-role': 'off',
      // What scrolls must be reachable by keyboard.
      'jsx-a11y/no-noninteractive-tabindex': ['error', { tags: [], roles: ['tabpanel', 'region', 'group'] }],
      'no-restricted-syntax': [
        'error',
        {
          selector: "JSXAttribute[name.name='dangerouslySetInnerHTML']",
          message: 'Text is shown as text.',
        },
      ],
    },
  },
  {
    // Folded into blocks by the style sheet, the parts of a table would lose their roles if these were not written.
    files: ['src/components/ui/table.tsx', 'src/components/charts/balance-table.tsx'],
    rules: {
      'jsx-a11y/no-redundant-roles': 'off',
      'jsx-a11y/no-interactive-element-to-noninteractive-role': 'off',
    },
  },
  {
    files: ['tests/**', 'server/database/seeds/**', 'shared/library/**', 'shared/checks/defaults/**'],
    rules: {
      'max-lines': 'off',
      'max-lines-per-function': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
    },
  },
  { files: ['tests/**'], rules: { 'no-restricted-properties': 'off' } },
);
