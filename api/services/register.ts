/** The parts register: search, filters, sort, and pages that stay fast at 100,000 parts. */
import { col, fn, Op, where, type WhereOptions } from 'sequelize';
import type { z } from 'zod';
import type { listPartsSchema, PartList, PartRow } from '../../shared/contracts/parts';
import type { Database } from '../models/database';
import type { PartRecord } from '../models/parts';
import { done, type Outcome } from './outcome';
import { namesOf } from './people';
import { type Cursor, readCursor, writeCursor } from './register-cursor';
import { searchWords } from './register-keys';

type Query = z.output<typeof listPartsSchema>;

const SORT_COLUMNS = { number: 'numberKey', title: 'titleKey', changed: 'changedAt' } as const;

function sortOf(sort: Query['sort']) {
  const falling = sort.startsWith('-');
  const column = SORT_COLUMNS[sort.replace('-', '') as keyof typeof SORT_COLUMNS];
  return {
    column,
    direction: falling ? 'DESC' : 'ASC',
    beyond: falling ? Op.lt : Op.gt,
    upTo: falling ? Op.lte : Op.gte,
  };
}

const filters = (query: Query): WhereOptions[] => [
  ...(query.material === undefined ? [] : [{ material: query.material }]),
  ...(query.unit === undefined ? [] : [{ unit: query.unit }]),
  ...searchWords(query.search ?? '').map((word) => where(fn('instr', col('search_text'), word), Op.gt, 0)),
];

/** Rows after the cursor. The first condition is what lets the index start there; the second settles ties. */
const after = (cursor: Cursor, { column, beyond, upTo }: ReturnType<typeof sortOf>): WhereOptions => ({
  [Op.and]: [
    { [column]: { [upTo]: cursor.key } },
    { [Op.or]: [{ [column]: { [beyond]: cursor.key } }, { id: { [beyond]: cursor.id } }] },
  ],
});

export async function listParts(database: Database, query: Query): Promise<Outcome<PartList>> {
  const sort = sortOf(query.sort);
  const cursor = query.after === undefined ? null : readCursor(query.sort, query.after);
  if (query.after !== undefined && cursor === null) {
    const message = 'This is not where a page with this order ended. Start from the first page.';
    return { ok: false, reason: 'refused', errors: [{ path: 'after', message }] };
  }
  const wanted = filters(query);
  const [found, total, materials] = await Promise.all([
    database.parts.findAll({
      where: { [Op.and]: [...wanted, ...(cursor ? [after(cursor, sort)] : [])] },
      order: [
        [sort.column, sort.direction],
        ['id', sort.direction],
      ],
      // One more than asked for tells whether there is a next page.
      limit: query.limit + 1,
      raw: true,
    }),
    database.parts.count({ where: { [Op.and]: wanted } }),
    everyMaterial(database),
  ]);
  const rows = found.slice(0, query.limit);
  const last = found.length > query.limit ? rows.at(-1) : undefined;
  return done({
    parts: await withNamesAndOutlines(database, rows),
    next: last ? writeCursor(query.sort, { key: last[sort.column], id: last.id }) : null,
    total,
    materials,
  });
}

/** Steps from one material to the next through the index: a register has many parts and few materials. */
async function everyMaterial(database: Database): Promise<string[]> {
  const [rows] = await database.sequelize.query(
    `WITH RECURSIVE step (material) AS (
       SELECT MIN(material) FROM parts
       UNION ALL
       SELECT (SELECT MIN(material) FROM parts WHERE material > step.material) FROM step WHERE step.material IS NOT NULL
     ) SELECT material FROM step WHERE material IS NOT NULL`,
  );
  return (rows as { material: string }[]).map((row) => row.material);
}

async function withNamesAndOutlines(database: Database, rows: readonly PartRecord[]): Promise<PartRow[]> {
  const ids = rows.map((row) => row.id);
  const [names, revisions] = await Promise.all([
    namesOf(
      database,
      rows.map((row) => row.changedBy),
    ),
    database.revisions.findAll({
      where: { partId: ids },
      attributes: ['partId', 'letter', 'outline'],
      raw: true,
    }),
  ]);
  const outlines = new Map(revisions.map((row) => [`${row.partId} ${row.letter}`, row.outline]));
  return rows.map((row) => {
    const outline = outlines.get(`${row.id} ${row.revision}`) ?? null;
    return {
      id: row.id,
      number: row.number,
      title: row.title,
      revision: row.revision,
      state: row.state,
      unit: row.unit,
      thickness: row.thickness,
      material: row.material,
      blankLength: row.blankLength,
      blankWidth: row.blankWidth,
      bends: row.bends,
      stops: row.stops,
      outline: outline === null ? null : (JSON.parse(outline) as PartRow['outline']),
      changedAt: row.changedAt,
      changedBy: names.get(row.changedBy) ?? '',
    };
  });
}
