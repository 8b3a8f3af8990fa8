import { dirname, relative, resolve, sep } from 'node:path';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Which folders of `core` a folder may import from (itself is always allowed). One direction, no cycles. */
export const coreLayers = {
  errors: [],
  units: ['errors'],
  numerics: ['errors'],
  formula: ['errors', 'library', 'record'],
  library: ['errors', 'units'],
  symmetry: ['errors', 'numerics'],
  geometry: ['errors', 'units', 'numerics', 'library', 'symmetry', 'record'],
  record: ['errors', 'units', 'library', 'numerics'],
  dshell: ['errors', 'units', 'numerics', 'symmetry'],
  estimation: ['errors', 'units', 'numerics', 'library', 'symmetry', 'geometry', 'record', 'dshell'],
  spin: ['errors', 'units', 'numerics', 'library', 'record', 'dshell', 'estimation'],
  magnetism: ['errors', 'units', 'numerics', 'library', 'symmetry', 'dshell', 'estimation'],
  transitions: [
    'errors',
    'units',
    'numerics',
    'library',
    'symmetry',
    'geometry',
    'record',
    'dshell',
    'estimation',
    'spin',
  ],
  spectrum: ['errors', 'units', 'numerics', 'library', 'transitions'],
  colour: ['errors', 'units', 'numerics', 'library', 'transitions', 'spectrum'],
  prediction: [
    ...['errors', 'units', 'numerics', 'library', 'symmetry', 'geometry', 'record', 'dshell', 'estimation'],
    ...['spin', 'magnetism', 'transitions', 'spectrum', 'colour'],
  ],
  search: [
    ...['errors', 'units', 'numerics', 'library', 'symmetry', 'geometry', 'record', 'dshell', 'estimation'],
    ...['spin', 'magnetism', 'transitions', 'spectrum', 'colour', 'prediction'],
  ],
  measured: ['errors', 'units', 'numerics', 'library', 'record', 'dshell', 'spectrum'],
  agreement: [
    'errors',
    'units',
    'numerics',
    'library',
    'record',
    'estimation',
    'measured',
    'prediction',
    'colour',
  ],
};

const root = import.meta.dirname;
const posix = (path) => relative(root, path).split(sep).join('/');

/** The layer of a file: `core/units`, `renderer/store`, `main`, ... */
function place(path) {
  const [top, second] = posix(path).split('/');
  if (top === 'core') return { top, folder: second.replace(/\.ts$/, '') };
  return { top, folder: second };
}

function refusal(from, to, specifier) {
  if (from.top === 'core') {
    if (to === null) {
      return specifier.startsWith('node:') ||
        /^(electron|react|react-dom|dexie|recharts)(\/|$)/.test(specifier)
        ? `core knows no screen, no database and no Node: it may not import "${specifier}".`
        : null;
    }
    if (to.top !== 'core')
      return `core imports neither main nor renderer; imports run renderer -> core and main -> core.`;
    if (from.folder === 'index' || from.folder === to.folder) return null;
    const allowed = coreLayers[from.folder];
    if (allowed === undefined)
      return `core/${from.folder} has no row in the table of layers (eslint.config.js).`;
    if (to.folder === 'errors' || allowed.includes(to.folder)) return null;
    return `core/${from.folder} may import ${allowed.map((name) => `core/${name}`).join(', ')}; not core/${to.folder}.`;
  }
  if (from.top === 'renderer') {
    if (to === null) {
      if (specifier.startsWith('node:') || specifier === 'electron')
        return `renderer has no Node and no Electron: use the bridge in renderer/host.`;
      if (/^dexie/.test(specifier) && from.folder !== 'store')
        return `only renderer/store imports "${specifier}".`;
      if (specifier === 'recharts' && from.folder !== 'plots')
        return `only renderer/plots imports "recharts".`;
      return null;
    }
    if (to.top === 'main')
      return `renderer never imports main; the bridge interface is in renderer/host/bridge.ts.`;
    return null;
  }
  if (from.top === 'main' && to !== null && to.top === 'renderer' && to.folder !== 'host') {
    return `main imports core, and from renderer only the bridge types in renderer/host.`;
  }
  return null;
}

/** Imports run one way; the message says which way is open. */
export const importDirection = {
  meta: { type: 'problem', schema: [], messages: { refused: '{{why}}' } },
  create(context) {
    const from = place(context.filename);
    const check = (node, source) => {
      if (!source || typeof source.value !== 'string') return;
      const specifier = source.value;
      const to = specifier.startsWith('.') ? place(resolve(dirname(context.filename), specifier)) : null;
      const why = refusal(from, to, specifier);
      if (why) context.report({ node, messageId: 'refused', data: { why } });
    };
    return {
      ImportDeclaration: (node) => check(node, node.source),
      ExportNamedDeclaration: (node) => check(node, node.source),
      ExportAllDeclaration: (node) => check(node, node.source),
      ImportExpression: (node) => check(node, node.source),
    };
  },
};

export default tseslint.config(
  {
    ignores: ['dist', 'release', 'coverage', 'node_modules', 'test-results', 'playwright-report', '.reports'],
  },
  ...tseslint.configs.recommended,
  {
    files: ['**/*.ts', '**/*.tsx'],
    plugins: { spinhue: { rules: { 'import-direction': importDirection } } },
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
    },
  },
  {
    files: ['core/**/*.ts', 'renderer/**/*.{ts,tsx}', 'main/**/*.ts'],
    ignores: ['**/*.test.ts', '**/*.test.tsx', 'core/testing/**', 'main/testing/**', 'main/bench/**'],
    rules: { 'spinhue/import-direction': 'error' },
  },
  {
    files: ['renderer/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      'no-restricted-syntax': [
        'error',
        { selector: "JSXAttribute[name.name='dangerouslySetInnerHTML']", message: 'Rendered text is text.' },
      ],
    },
  },
  {
    files: ['core/**/*.ts'],
    ignores: ['**/*.test.ts', 'core/testing/**'],
    rules: {
      'no-restricted-globals': [
        'error',
        ...[
          'window',
          'document',
          'navigator',
          'process',
          'console',
          'Buffer',
          'require',
          'setTimeout',
          'fetch',
        ],
      ],
    },
  },
);
