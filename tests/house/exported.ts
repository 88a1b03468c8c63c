import type { ESTree } from 'vite';
import type { SourceFile } from './source-file.ts';

/** A function, constant, class or type that a file exports, with the comment that stands right above it. */
export interface Exported {
  readonly file: SourceFile;
  readonly name: string;
  readonly kind: 'function' | 'constant' | 'class' | 'type';
  readonly start: number;
  /** The text of its doc comment; empty when it has none. */
  readonly doc: string;
  readonly declaration: ESTree.Declaration;
}

/** What a file exports, in its order: functions, constants, classes and types. */
export function exportedFrom(file: SourceFile): Exported[] {
  return file.program.body.flatMap((statement): Exported[] => {
    if (statement.type !== 'ExportNamedDeclaration' || !statement.declaration) return [];
    const { declaration, start } = statement;
    const common = { file, start, doc: docAbove(file, start), declaration };
    if (declaration.type === 'FunctionDeclaration')
      return [{ ...common, name: declaration.id?.name ?? '', kind: 'function' }];
    if (declaration.type === 'ClassDeclaration')
      return [{ ...common, name: declaration.id?.name ?? '', kind: 'class' }];
    if (declaration.type === 'TSTypeAliasDeclaration' || declaration.type === 'TSInterfaceDeclaration')
      return [{ ...common, name: declaration.id.name, kind: 'type' }];
    if (declaration.type !== 'VariableDeclaration') return [];
    return declaration.declarations.map((one) => ({
      ...common,
      name: file.text.slice(one.id.start, one.id.end).split(':')[0] ?? '',
      kind: one.init?.type === 'ArrowFunctionExpression' ? 'function' : 'constant',
    }));
  });
}

/** The parameters of an exported function. */
export function parametersOf(exported: Exported): ESTree.ParamPattern[] {
  const { declaration } = exported;
  if (declaration.type === 'FunctionDeclaration') return declaration.params;
  if (declaration.type !== 'VariableDeclaration') return [];
  const init = declaration.declarations[0]?.init;
  return init?.type === 'ArrowFunctionExpression' ? init.params : [];
}

function docAbove(file: SourceFile, start: number): string {
  const above = file.comments.filter((comment) => comment.end <= start).at(-1);
  if (above === undefined || above.type !== 'Block' || !above.value.startsWith('*')) return '';
  return file.text.slice(above.end, start).trim() === '' ? plain(above.value) : '';
}

/** A doc comment without its stars. */
function plain(comment: string): string {
  return comment
    .split('\n')
    .map((line) => line.replace(/^\s*\*+ ?/, ''))
    .join('\n')
    .trim();
}
