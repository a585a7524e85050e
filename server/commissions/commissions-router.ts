import type { Database, Queries } from '@drizzle/database';
import type { Commission, CommissionChanges } from '@shared/api/commission';
import { readLayout } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import { API_ROUTES } from '../api-routes';
import { badInput, notFound } from '../http/errors';
import type { RouteMount } from '../http/route';
import { problemsWithin } from '../http/validate';
import { archivedRefusal } from './archive';
import {
  insertCommission,
  listCommissions,
  lockCommission,
  updateCommission,
} from './commissions-store';

/** Listing, making and changing commissions. */
export function mountCommissions(mount: RouteMount, database: Database): void {
  mount(API_ROUTES.listCommissions, async ({ person, query }) => ({
    commissions: await listCommissions(database, person.workshop.id, {
      archived: query.archived && (query.archived === 'true' ? 'only' : 'none'),
    }),
  }));

  mount(API_ROUTES.createCommission, ({ person, body }) => {
    const { layout: file, ...start } = body;
    const layout = file === undefined ? startingLayout(start.title) : layoutIn(file);
    return database.transaction(async (transaction) => {
      const id = await insertCommission(transaction, person.workshop.id, { ...start, layout });
      return commissionNamed(transaction, person.workshop.id, id);
    });
  });

  mount(API_ROUTES.readCommission, ({ person, params }) =>
    commissionNamed(database, person.workshop.id, params.id),
  );

  mount(API_ROUTES.changeCommission, ({ person, params, body }) =>
    database.transaction(async (transaction) => {
      const locked = await lockCommission(transaction, person.workshop.id, params.id);
      if (!locked) throw notFound('commission');
      if (locked.archived && !takesOut(body)) throw archivedRefusal();
      await updateCommission(transaction, params.id, body);
      return commissionNamed(transaction, person.workshop.id, params.id);
    }),
  );
}

function layoutIn(file: unknown): Layout {
  const reading = readLayout(file);
  if (!reading.ok) throw badInput(problemsWithin('layout', reading.problems));
  return reading.layout;
}

/** Nothing but taking it out can be done to an archived commission; saying "archived" again is harmless. */
function takesOut({ archived, ...others }: CommissionChanges): boolean {
  if (archived === undefined) return false;
  return !archived || Object.keys(others).length === 0;
}

async function commissionNamed(
  queries: Queries,
  workshopId: string,
  id: string,
): Promise<Commission> {
  const [commission] = await listCommissions(queries, workshopId, { id });
  if (!commission) throw notFound('commission');
  return commission;
}
