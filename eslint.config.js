import globals from 'globals'
import pluginVue from 'eslint-plugin-vue'
import tseslint from 'typescript-eslint'

/** Data flows one way: each border is an import that may not be written. */
function refuse(patterns, message) {
  return { 'no-restricted-imports': ['error', { patterns: patterns.map((regex) => ({ regex, message })) }] }
}

export default tseslint.config(
  { ignores: ['dist', 'data', 'drizzle', 'coverage'] },
  ...tseslint.configs.recommended,
  ...pluginVue.configs['flat/recommended-error'],
  {
    languageOptions: { globals: { ...globals.browser, ...globals.node }, parserOptions: { parser: tseslint.parser } },
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': 'error',
      'no-console': 'error',
      'vue/multi-word-component-names': 'off',
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
      'vue/html-indent': 'off',
      'vue/html-closing-bracket-newline': 'off',
      'vue/multiline-html-element-content-newline': 'off',
      'vue/first-attribute-linebreak': 'off',
      'vue/html-closing-bracket-spacing': 'off',
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: refuse(['^(?!\\.{1,2}/|zod$|#?mathjs)'], 'shared imports nothing but zod and the parser of mathjs'),
  },
  {
    files: ['shared/**/*.ts'],
    ignores: ['shared/engine/formula/**'],
    rules: refuse(['^(?!\\.{1,2}/|zod$)'], 'only shared/engine/formula may import mathjs'),
  },
  {
    files: ['shared/engine/formula/mathjsInNode.ts'],
    rules: refuse(['^(?!node:module$|mathjs)'], 'this file loads mathjs and nothing else'),
  },
  {
    files: ['src/**/*.{ts,vue}'],
    rules: refuse(['/server/', '/seed/', '^node:', '^hyperformula'], 'the client imports from src and shared alone'),
  },
  {
    files: ['server/**/*.ts'],
    rules: refuse(['/src/', '/tests/', '^vue', '^hyperformula'], 'the server imports from server, shared and seed alone'),
  },
  { files: ['server/commands/**', 'tests/bench/**', 'seed/**'], rules: { 'no-console': 'off' } },
)
