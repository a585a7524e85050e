import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import * as z from 'zod';

const SCRIPT = fileURLToPath(new URL('read_dxf.py', import.meta.url));

const pointSchema = z.tuple([z.number(), z.number(), z.number()]);

const dxfReadingSchema = z.object({
  version: z.string(),
  insunits: z.number().nullable(),
  layers: z.array(z.string()),
  errors: z.array(z.string()),
  fixes: z.array(z.string()),
  polylines: z.array(
    z.object({
      type: z.enum(['LWPOLYLINE', 'POLYLINE']),
      layer: z.string(),
      closed: z.boolean(),
      points: z.array(pointSchema),
      arcs: z.array(
        z.object({
          radius: z.number(),
          centre: z.tuple([z.number(), z.number()]),
          bulge: z.number(),
        }),
      ),
    }),
  ),
  texts: z.array(z.object({ layer: z.string(), plain: z.string() })),
  others: z.array(z.string()),
});
export type DxfReading = z.infer<typeof dxfReadingSchema>;

/** What Debian's ezdxf reads in each file, its audit included; one Python process for all of them. */
export function readWithEzdxf(paths: readonly string[]): DxfReading[] {
  const run = spawnSync('/usr/bin/python3', [SCRIPT], {
    input: JSON.stringify(paths),
    encoding: 'utf8',
    maxBuffer: 1 << 28,
  });
  if (run.status !== 0) throw new Error(`ezdxf could not read the files: ${run.stderr}`);
  return z.array(dxfReadingSchema).parse(JSON.parse(run.stdout));
}
