import type { Queries } from '@drizzle/database';
import { bundleExports } from '@drizzle/schema/index';

export type BundleExport = typeof bundleExports.$inferInsert;

/** Records who took which bundle out, with what options, and why in spite of a stop. */
export async function recordExport(queries: Queries, entry: BundleExport): Promise<void> {
  await queries.insert(bundleExports).values(entry);
}
