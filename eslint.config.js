import { existsSync } from 'node:fs'
import { relative, sep } from 'node:path'
import js from '@eslint/js'
import prettier from 'eslint-config-prettier/flat'
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript'
import { importX } from 'eslint-plugin-import-x'
import vue from 'eslint-plugin-vue'
import { defineConfig, globalIgnores } from 'eslint/config'
import globals from 'globals'
import tseslint from 'typescript-eslint'

const domains = [
  'accounts',
  'courses',
  'media',
  'exercises',
  'progress',
  'builds',
  'fence',
  'notices',
  'payments',
  'insights',
  'office',
]
const root = import.meta.dirname

/** Rule 2: which of the four rooms may open into which. */
const roomZones = [
  { target: './src', from: ['./server', './media'], message: 'The client imports src and shared.' },
  { target: './server', from: './src', message: 'The server imports server and shared.' },
  {
    target: './shared',
    from: ['./src', './server', './media', './drizzle'],
    message: 'Shared code imports shared code only.',
  },
  {
    target: ['./src', './server', './shared'],
    from: './tests',
    message: 'Nothing imports tests.',
  },
]

/** Rules 3 to 5: routes and sockets call services, services call queries, queries call the database. */
const layerZones = [
  {
    target: './server/**/*.{routes,socket}.ts',
    from: ['./server/db', './server/jobs'],
    message: 'Routes and sockets call their own service.',
  },
  {
    target: './server/**/*.{routes,socket}.ts',
    from: './server/**/*.queries.ts',
    message: 'Routes and sockets call their own service.',
  },
  {
    target: './server/**/*.{routes,socket}.ts',
    from: './shared',
    except: ['./contracts'],
    message: 'Routes and sockets know contracts; the rest is the work of their service.',
  },
  {
    target: './server/**/*.service.ts',
    from: './server/db',
    except: ['./client.ts', './transaction.ts'],
    message: 'Services open transactions; tables belong to queries.',
  },
  {
    target: './server/**/*.service.ts',
    from: ['./server/**/*.{routes,socket}.ts', './server/middleware/**/*'],
    message: 'A service does not know how it is called.',
  },
  {
    target: './server/**/*.queries.ts',
    from: ['./server/**/*.{routes,socket,service}.ts', './server/middleware/**/*'],
    message: 'Queries know the database and contract types.',
  },
  {
    target: './server/**/*.queries.ts',
    from: './shared',
    except: ['./contracts'],
    message: 'Queries know the database and contract types.',
  },
]

/** Rule 6: another domain is reached through its service only, from routes and sockets not at all. */
const domainZones = domains.flatMap((domain) => {
  const others = `./server/{${domains.filter((other) => other !== domain).join(',')}}/**/*`
  return [
    {
      target: `./server/${domain}`,
      from: others,
      except: ['**/*.service.ts'],
      message: "Reach another domain through its service (import '../<domain>/<noun>.service').",
    },
    {
      target: `./server/${domain}/*.{routes,socket}.ts`,
      from: others,
      message: 'Routes and sockets call the service of their own domain.',
    },
  ]
})
const serverZones = [
  {
    target: ['./server/middleware', './server/jobs'],
    from: `./server/{${domains.join(',')}}/**/*.{queries,routes,socket}.ts`,
    message: 'Middleware and jobs reach a domain through its service.',
  },
]

/** Rules 7 and 8: what is seen knows stores and composables; base components know nothing but props. */
const clientZones = [
  {
    target: ['./src/{pages,layouts,components,router,css}/**/*', './src/*'],
    from: ['./src/api', './src/socket'],
    message: 'Only stores and composables talk to the server.',
  },
  {
    target: './src/{components,composables,stores,api,socket}/**/*',
    from: ['./src/layouts', './src/router'],
    message: 'Pages and layouts are put together by the router.',
  },
  {
    target: ['./src/!(router)/**/*', './src/*'],
    from: './src/pages',
    message: 'Pages are imported by the router alone, lazily.',
  },
  {
    target: './src/components/base',
    from: './src',
    except: ['./components/base', './assets'],
    message: 'Base components know base components and props.',
  },
  {
    target: './src/components/base',
    from: './shared',
    message: 'Base components know base components and props.',
  },
]

const drizzlePackages = {
  regex: '^(drizzle-orm|mysql2)(/|$)',
  message: 'Only queries and db/ speak to the database.',
}
const webPackages = {
  regex: '^(express|express-.*|helmet|socket\\.io)(/|$)',
  message: 'Only routes, sockets and middleware know how the server is called.',
}

/** A test whose source is gone or was renamed is an error: tests/<path>.test.ts belongs to <path>. */
const testHasSource = {
  meta: {
    type: 'problem',
    schema: [],
    messages: { missing: 'No {{source}}.ts or .vue: move the test where its source is.' },
  },
  create(context) {
    const path = relative(root, context.filename).split(sep).join('/')
    const source = /^tests\/((?:src|server|shared)\/.+)\.test\.ts$/.exec(path)?.[1]
    if (!source) return {}
    return {
      Program(node) {
        const found = ['.ts', '.vue', '.mjs', ''].some((end) =>
          existsSync(`${root}/${source}${end}`),
        )
        if (!found) context.report({ node, messageId: 'missing', data: { source } })
      },
    }
  },
}

export default defineConfig(
  globalIgnores(['node_modules', 'dist', '.data', '.cache', 'coverage', 'drizzle']),
  { linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  tseslint.configs.strictTypeChecked,
  vue.configs['flat/recommended'],
  {
    files: ['**/*.{ts,vue}'],
    languageOptions: {
      parserOptions: {
        parser: tseslint.parser,
        projectService: true,
        tsconfigRootDir: root,
        extraFileExtensions: ['.vue'],
      },
    },
  },
  {
    plugins: { 'import-x': importX, house: { rules: { 'test-has-source': testHasSource } } },
    settings: {
      'import-x/extensions': ['.ts', '.vue', '.js', '.mjs'],
      'import-x/parsers': {
        '@typescript-eslint/parser': ['.ts'],
        'vue-eslint-parser': ['.vue'],
      },
      'import-x/resolver-next': [
        createTypeScriptImportResolver({
          project: 'tsconfig.json',
          extensions: ['.ts', '.vue', '.js', '.mjs', '.json'],
        }),
      ],
    },
    rules: {
      'import-x/no-restricted-paths': [
        'error',
        {
          basePath: root,
          zones: [...roomZones, ...layerZones, ...domainZones, ...serverZones, ...clientZones],
        },
      ],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'import-x/no-self-import': 'error',
      'import-x/no-duplicates': 'error',
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx', 'hack'] }],
      'no-restricted-syntax': [
        'error',
        {
          selector:
            "CallExpression[callee.object.object.property.name='query'] Property[key.name='with']",
          message: 'MariaDB does not understand relational queries: use select() with leftJoin().',
        },
      ],
      eqeqeq: 'error',
      'no-console': 'error',
    },
  },
  {
    files: ['**/*.{ts,vue}'],
    rules: {
      'no-undef': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-confusing-void-expression': 'off',
      '@typescript-eslint/require-await': 'off',
      '@typescript-eslint/no-unnecessary-condition': [
        'error',
        { allowConstantLoopConditions: 'only-allowed-literals' },
      ],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
    },
  },
  {
    files: ['**/*.{js,mjs}'],
    extends: [tseslint.configs.disableTypeChecked],
    languageOptions: { globals: globals.node },
  },
  {
    files: ['src/**/*.{ts,vue}'],
    ignores: ['src/api/**', 'src/socket/**'],
    rules: {
      'no-restricted-globals': [
        'error',
        ...['fetch', 'XMLHttpRequest', 'WebSocket', 'EventSource'].map((name) => ({
          name,
          message: 'Talk to the server in src/api or src/socket.',
        })),
      ],
      'no-restricted-properties': [
        'error',
        { property: 'sendBeacon', message: 'Talk to the server in src/api.' },
      ],
    },
  },
  {
    files: ['src/**/*.vue'],
    rules: {
      ...tseslint.configs.disableTypeChecked.rules,
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/await-thenable': 'error',
      'vue/block-lang': ['error', { script: { lang: 'ts' } }],
      'vue/block-order': ['error', { order: ['script', 'template', 'style'] }],
      'vue/component-api-style': ['error', ['script-setup']],
      'vue/component-name-in-template-casing': ['error', 'PascalCase'],
      'vue/define-emits-declaration': ['error', 'type-based'],
      'vue/define-macros-order': 'error',
      'vue/define-props-declaration': ['error', 'type-based'],
      'vue/enforce-style-attribute': ['error', { allow: ['scoped'] }],
      'vue/no-unused-refs': 'error',
      'vue/no-useless-v-bind': 'error',
      'vue/no-v-html': 'error',
      'vue/require-default-prop': 'off',
    },
  },
  {
    files: ['src/App.vue'],
    rules: { 'vue/enforce-style-attribute': 'off' },
  },
  {
    files: ['src/router/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: '/pages/', message: 'Pages are loaded lazily: () => import(…).' }] },
      ],
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex: '^(?!\\.{1,2}/|zod(/|$)|mathjs(/|$)|fraction\\.js$|highs$|webvtt-parser$)',
              message:
                'Shared code imports shared code, zod, pure maths libraries and the caption parser.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['src/**/*.{ts,vue}', 'shared/**/*.ts', 'server/**/*.ts'],
    ignores: ['src/env.d.ts'],
    rules: { 'import-x/no-default-export': 'error' },
  },
  {
    files: ['src/**/*.vue'],
    rules: { 'import-x/no-default-export': 'off' },
  },
  {
    files: ['server/**/*.ts'],
    rules: { 'no-restricted-imports': ['error', { patterns: [drizzlePackages] }] },
  },
  {
    files: ['server/cli/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ ...drizzlePackages, regex: '^drizzle-orm(/|$)' }] },
      ],
    },
  },
  {
    files: ['server/**/*.service.ts'],
    rules: { 'no-restricted-imports': ['error', { patterns: [drizzlePackages, webPackages] }] },
  },
  {
    files: ['server/**/*.queries.ts', 'server/db/**/*.ts'],
    rules: { 'no-restricted-imports': ['error', { patterns: [webPackages] }] },
  },
  {
    files: ['server/cli/**', 'tests/bench/**', 'media/**'],
    rules: { 'no-console': 'off' },
  },
  {
    files: ['tests/**/*.ts'],
    rules: {
      'house/test-has-source': 'error',
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
    },
  },
  {
    files: ['eslint.config.js', 'server/db/seed/**', 'tests/reference/**'],
    rules: { 'max-lines': 'off' },
  },
  prettier,
)
