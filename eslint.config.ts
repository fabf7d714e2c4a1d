import { existsSync, readdirSync } from 'node:fs'
import js from '@eslint/js'
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript'
import { importX } from 'eslint-plugin-import-x'
import reactHooks from 'eslint-plugin-react-hooks'
import globals from 'globals'
import tseslint from 'typescript-eslint'

/** Packages that may appear only in the folders named. */
const restrict = (
  files: string[],
  patterns: { group: string[]; message: string }[],
  ignores: string[] = [],
) => ({
  files,
  ignores,
  rules: { '@typescript-eslint/no-restricted-imports': ['error', { patterns }] as ['error', object] },
})

const ui = [
  'react',
  'react/*',
  'react-dom',
  'react-dom/*',
  'react-router-dom',
  '@tanstack/*',
  'konva',
  'konva/*',
  'react-konva',
]
const sharedOutside = {
  group: [
    ...ui,
    'express',
    'express-*',
    'drizzle-orm',
    'drizzle-orm/*',
    'postgres',
    'node:*',
    'pino',
    'sharp',
    'exceljs',
  ],
  message: 'shared is pure TypeScript: no React, Express, database, clock, random or network.',
}
const konva = { group: ['konva', 'konva/*', 'react-konva'], message: 'Konva stops at survey-editor/canvas.' }
const react = {
  group: ['react', 'react/*', 'react-dom', 'react-dom/*', 'react-router-dom', '@tanstack/*'],
  message: 'React never enters the editor’s model or tools.',
}
const express = { group: ['express', 'express-*'], message: 'Express stops at app.ts, http and *.routes.ts.' }
const drizzle = {
  group: ['drizzle-orm', 'drizzle-orm/*', 'postgres'],
  message: 'Drizzle stops at database and *.queries.ts.',
}

const here = new URL('.', import.meta.url).pathname
/** Zones: `target` may not import `from`. The order of shared is units, geometry, schemas, permissions and endpoints, survey, calculation, cut-list. */
const zone = (target: string, from: string[], message: string) => ({
  target: `${here}${target}`,
  from: from.map((name) => `${here}${name}`),
  message,
})
const foldersIn = (name: string): string[] =>
  existsSync(`${here}${name}`)
    ? readdirSync(`${here}${name}`, { withFileTypes: true }).flatMap((entry) =>
        entry.isDirectory() ? [entry.name] : [],
      )
    : []
/** On the client a feature never imports another: the route joins them. */
const clientFeatures = foldersIn('src/features').map((name) => ({
  target: `${here}src/features/${name}`,
  from: `${here}src/features`,
  except: [`./${name}`],
  message: 'A feature never imports another: join them in src/app/routes.',
}))
/** On the server a feature reaches another through its service. */
const serverFeatures = foldersIn('server/features').map((name) => ({
  target: `${here}server/features/${name}/**`,
  from: `${here}server/features/!(${name})/*.{queries,routes}.ts`,
  message: 'Reach another feature through its service.',
}))
const later = ['shared/survey', 'shared/calculation', 'shared/cut-list']

export default tseslint.config(
  { ignores: ['node_modules', 'dist', '.data', '.cache', 'drizzle', 'test-results', 'playwright-report'] },
  js.configs.recommended,
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: {
      globals: { ...globals.node, ...globals.browser },
      parserOptions: { projectService: { allowDefaultProject: ['scripts/*.mjs'] }, tsconfigRootDir: here },
    },
    plugins: { 'import-x': importX },
    settings: {
      'import-x/resolver-next': [createTypeScriptImportResolver({ project: `${here}tsconfig.json` })],
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      eqeqeq: 'error',
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'import-x/no-restricted-paths': [
        'error',
        {
          zones: [
            ...clientFeatures,
            ...serverFeatures,
            zone('shared', ['server', 'src', 'tests', 'e2e', 'scripts'], 'shared imports only itself.'),
            zone('server', ['src', 'tests', 'e2e', 'scripts'], 'server imports shared, never src.'),
            zone('src', ['server', 'tests', 'e2e', 'scripts'], 'src imports shared, never server.'),
            zone(
              'shared/units',
              ['shared/geometry', 'shared/schemas', 'shared/permissions', 'shared/endpoints', ...later],
              'units come first.',
            ),
            zone(
              'shared/geometry',
              ['shared/schemas', 'shared/permissions', 'shared/endpoints', ...later],
              'geometry knows only units.',
            ),
            zone(
              'shared/schemas',
              ['shared/permissions', 'shared/endpoints', ...later],
              'schemas know only units and geometry.',
            ),
            zone('shared/permissions', ['shared/endpoints', ...later], 'permissions know only schemas.'),
            zone(
              'shared/survey',
              ['shared/calculation', 'shared/cut-list'],
              'survey comes before calculation.',
            ),
            zone('shared/calculation', ['shared/cut-list'], 'calculation comes before cut-list.'),
          ],
        },
      ],
    },
  },
  restrict(['shared/**/*.ts'], [sharedOutside]),
  restrict(
    ['src/**/*.{ts,tsx}'],
    [konva],
    ['src/features/survey-editor/canvas/**', 'src/features/survey-editor/{model,tools}/**'],
  ),
  restrict(['src/features/survey-editor/{model,tools}/**'], [konva, react]),
  restrict(
    ['server/**/*.ts'],
    [express, drizzle],
    [
      'server/app.ts',
      'server/http/**',
      'server/**/*.routes.ts',
      'server/database/**',
      'server/**/*.queries.ts',
    ],
  ),
  restrict(['server/{http/**,**/*.routes.ts,app.ts}'], [drizzle], ['server/http/**/*.queries.ts']),
  restrict(['server/{database/**,**/*.queries.ts}'], [express]),
  { files: ['src/**/*.{ts,tsx}'], ...reactHooks.configs.flat['recommended-latest'] },
  { files: ['**/*.mjs'], ...tseslint.configs.disableTypeChecked },
  {
    // Fixtures and drivers in tests reach into things on purpose.
    files: ['tests/**', 'e2e/**'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
)
