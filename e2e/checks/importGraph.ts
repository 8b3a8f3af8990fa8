import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve, sep } from 'node:path';
import ts from 'typescript';

export type ImportGraph = ReadonlyMap<string, readonly string[]>;

const isSource = (name: string): boolean => /\.tsx?$/.test(name) && !/\.(test|spec)\.tsx?$/.test(name);

/** Whether an import or export leaves a trace in the built program; types do not. */
function isReal(node: ts.ImportDeclaration | ts.ExportDeclaration): boolean {
  if (ts.isExportDeclaration(node)) {
    if (node.isTypeOnly) return false;
    const { exportClause } = node;
    return !(
      exportClause &&
      ts.isNamedExports(exportClause) &&
      exportClause.elements.every((each) => each.isTypeOnly)
    );
  }
  const clause = node.importClause;
  if (clause === undefined) return true;
  if (clause.isTypeOnly) return false;
  const { name, namedBindings } = clause;
  return !(
    name === undefined &&
    namedBindings !== undefined &&
    ts.isNamedImports(namedBindings) &&
    namedBindings.elements.length > 0 &&
    namedBindings.elements.every((each) => each.isTypeOnly)
  );
}

/** Static imports between the source files of some folders; paths from the root, with forward slashes. */
export function importGraph(root: string, folders: readonly string[]): ImportGraph {
  const files = new Set<string>();
  for (const folder of folders) {
    for (const entry of readdirSync(join(root, folder), { recursive: true, withFileTypes: true })) {
      if (entry.isFile() && isSource(entry.name)) files.add(join(entry.parentPath, entry.name));
    }
  }
  const find = (path: string): string | undefined =>
    [path, `${path}.ts`, `${path}.tsx`, join(path, 'index.ts'), join(path, 'index.tsx')].find((each) =>
      files.has(each),
    );
  const name = (path: string): string => relative(root, path).split(sep).join('/');
  const graph = new Map<string, string[]>();
  for (const file of files) {
    const source = ts.createSourceFile(file, readFileSync(file, 'utf8'), ts.ScriptTarget.Latest, false);
    const targets = source.statements.flatMap((node) => {
      if (!(ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) || !isReal(node)) return [];
      const specifier = node.moduleSpecifier;
      if (specifier === undefined || !ts.isStringLiteral(specifier) || !specifier.text.startsWith('.'))
        return [];
      const target = find(resolve(dirname(file), specifier.text));
      return target === undefined ? [] : [name(target)];
    });
    graph.set(name(file), targets);
  }
  return graph;
}

/** Groups of files that reach each other, by Tarjan's method (1972); empty where the graph has no cycle. */
export function cycles(graph: ImportGraph): string[][] {
  const order = new Map<string, number>();
  const low = new Map<string, number>();
  const stack: string[] = [];
  const onStack = new Set<string>();
  const found: string[][] = [];
  const visit = (node: string): void => {
    order.set(node, order.size);
    low.set(node, order.get(node)!);
    stack.push(node);
    onStack.add(node);
    for (const next of graph.get(node) ?? []) {
      if (!order.has(next)) {
        visit(next);
        low.set(node, Math.min(low.get(node)!, low.get(next)!));
      } else if (onStack.has(next)) low.set(node, Math.min(low.get(node)!, order.get(next)!));
    }
    if (low.get(node) !== order.get(node)) return;
    const group: string[] = [];
    let last: string;
    do {
      last = stack.pop()!;
      onStack.delete(last);
      group.push(last);
    } while (last !== node);
    if (group.length > 1 || (graph.get(node) ?? []).includes(node)) found.push(group.sort());
  };
  for (const node of graph.keys()) if (!order.has(node)) visit(node);
  return found;
}
