import { readdirSync, readFileSync } from 'node:fs';
import ts from 'typescript';

/** The product's own source files under these folders, parsed, by path. */
export function sourcesUnder(folders: readonly string[]): Map<string, ts.SourceFile> {
  const paths = folders.flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: 'utf8' })
      .filter((name) => /\.tsx?$/.test(name))
      .map((name) => `${folder}/${name}`),
  );
  return new Map(paths.sort().map((path) => [path, parsed(path, readFileSync(path, 'utf8'))]));
}

export function parsed(path: string, code: string): ts.SourceFile {
  const kind = path.endsWith('x') ? ts.ScriptKind.TSX : ts.ScriptKind.TS;
  return ts.createSourceFile(path, code, ts.ScriptTarget.Latest, true, kind);
}

/** Every node of a file, outermost first. */
export function* nodesOf(node: ts.Node): Generator<ts.Node> {
  yield node;
  for (const child of node.getChildren()) yield* nodesOf(child);
}
