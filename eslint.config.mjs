import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

/** The engine serves every entry alike: comparing an id to a literal is how that promise breaks. */
const noBranchOnId = {
  selector: "BinaryExpression[operator=/^[!=]==?$/]:matches([left.property.name='id'], [left.name='id']) > Literal",
  message: 'The engine never branches on an id: let the entry say what differs.',
}

const config = [
  { ignores: ['.next/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'public/**'] },
  ...next,
  ...typescript,
  {
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      eqeqeq: 'error',
      'no-console': 'error',
      'max-lines': ['error', { max: 250, skipBlankLines: false, skipComments: false }],
    },
  },
  { files: ['scripts/**', 'tests/**'], rules: { 'no-console': 'off' } },
  {
    files: ['lib/calculators/*.ts', 'components/calculator/**', 'lib/schemas/**'],
    rules: { 'no-restricted-syntax': ['error', noBranchOnId] },
  },
]

export default config
