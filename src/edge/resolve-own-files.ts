import { registerHooks } from 'node:module';

/**
 * Says what file an import of one of our own means. Its name is written whole, so that nothing need be looked for on the
 * disk: with hundreds of files a start costs a third less.
 */
export function resolveOwnFiles(): void {
  registerHooks({
    resolve: (named, context, next) =>
      context.parentURL !== undefined && named.startsWith('.') && named.endsWith('.ts')
        ? { url: new URL(named, context.parentURL).href, format: 'module-typescript', shortCircuit: true }
        : next(named, context),
  });
}
