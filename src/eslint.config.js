import tseslint from 'typescript-eslint';
import hooks from 'eslint-plugin-react-hooks';

// The clock and chance stay outside the pure folders: results depend on their arguments alone.
const pure = {
  files: ['src/core/**', 'src/report/**'],
  rules: {
    'no-restricted-properties': [
      'error',
      { object: 'Date', property: 'now', message: 'core and report do not read the clock.' },
      { object: 'Math', property: 'random', message: 'core and report draw from a seeded source.' },
    ],
    'no-restricted-syntax': [
      'error',
      {
        selector: "NewExpression[callee.name='Date'][arguments.length=0]",
        message: 'core and report do not read the clock.',
      },
    ],
  },
};

export default tseslint.config(
  { ignores: ['**/*.js', '**/*.mjs', '**/*.cjs'] },
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/consistent-type-imports': 'error',
      'no-console': 'error',
      eqeqeq: 'error',
    },
  },
  {
    files: ['src/ui/**', 'src/main.tsx'],
    plugins: { 'react-hooks': hooks },
    rules: { 'react-hooks/rules-of-hooks': 'error' },
  },
  { files: ['src/cli/**', 'tests/bench/**'], rules: { 'no-console': 'off' } },
  pure,
);
