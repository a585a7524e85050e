import 'vitest';

declare module 'vitest' {
  interface ProvidedContext {
    /** A migrated database without rows that fresh ones are copied from. */
    templateDatabaseUrl: string;
  }
}
