import type { EntityManager } from '@mikro-orm/postgresql'

const words = ['climb', 'cruise', 'bench', 'winter', 'hot day', 'long propeller', 'short propeller', 'spare unit', 'trial', 'second pair']

/**
 * Adds n scenarios to a shop in a few statements: copies of its newest revision under other titles, owners in turn, spread over
 * the past year, many of them at the very same moment. For measurements and tests; a shop without any scenario cannot be filled.
 */
export async function fillScenarios(em: EntityManager, shopId: string, n: number): Promise<void> {
  await em.transactional(async (inner) => {
    const [source] = await inner.execute<{ id: string, engine_id: string }[]>(
      `select revisions.id, scenarios.engine_id from revisions join scenarios on scenarios.id = revisions.scenario_id
       where revisions.shop_id = ? order by revisions.created_at desc, revisions.number desc limit 1`, [shopId])
    if (!source) throw new Error('There is no scenario in this shop to copy.')
    const [engine] = await inner.execute<{ code: string, name: string, last: number }[]>(
      `update engines set last_scenario_number = last_scenario_number + ? where id = ? returning code, name, last_scenario_number as last`, [n, source.engine_id])
    if (!engine) throw new Error('The engine of that scenario is not there.')
    const first = engine.last - n
    // Five at a time share a moment; the counts vary as in a shop's own list.
    await inner.execute(`
      insert into scenarios (shop_id, engine_id, code, title, owner_id, current_revision, outside_count, close_count, within_count, updated_at, search)
      select ?, ?, code, title, owner_id, 1, case when i % 7 = 0 then i % 3 else 0 end, i % 4, 15, moment, lower(code) || e'\\n' || title || e'\\n' || lower(?)
      from (
        select i, ? || '-' || lpad((? + i)::text, greatest(2, length((? + i)::text)), '0') as code,
          (array[${words.map((word) => `'${word}'`).join(', ')}])[1 + i % ${words.length}] || ' ' || i as title,
          people[1 + i % array_length(people, 1)] as owner_id,
          date_trunc('milliseconds', now()) - (i / 5) * interval '3 minutes' as moment
        from generate_series(1, ?) i,
          (select array_agg(user_id order by user_id) as people from memberships where shop_id = ? and role in ('builder', 'designer', 'owner')) members
      ) rows`, [shopId, source.engine_id, engine.name, engine.code, first, first, n, shopId])
    await inner.execute(`
      insert into revisions (scenario_id, shop_id, number, title, sheet, sheet_version, engine_version, engine, results,
        outside_count, close_count, within_count, limits, calc_version, author_id, created_at, search)
      select scenarios.id, scenarios.shop_id, 1, scenarios.title, source.sheet, source.sheet_version, source.engine_version, source.engine, source.results,
        scenarios.outside_count, scenarios.close_count, scenarios.within_count, source.limits, source.calc_version, scenarios.owner_id, scenarios.updated_at, scenarios.search
      from scenarios, revisions source
      where source.id = ? and scenarios.engine_id = ? and not exists (select 1 from revisions one where one.scenario_id = scenarios.id)`, [source.id, source.engine_id])
  })
  // What the planner knows of the tables would otherwise come minutes later.
  await em.execute('analyze scenarios, revisions')
}
