import type { QueryInterface } from 'sequelize';

type Event = 'INSERT' | 'UPDATE' | 'DELETE';

/** A rule that the database itself holds, whoever writes: where `when` is true the statement is refused with `message`. */
export interface Refusal {
  table: string;
  on: Event[];
  /** SQL over NEW and OLD; `ROW` stands for the one that the event has. */
  when: string;
  message: string;
}

const nameOf = (table: string, event: Event) => `${table}_refuse_${event.toLowerCase()}`;

/** One trigger a table and event; made anew however often it is run. */
export async function refuse(context: QueryInterface, refusals: Refusal[]): Promise<void> {
  for (const [name, parts] of grouped(refusals)) {
    const { table, event } = parts[0];
    const checks = parts
      .map(({ when, message }) => {
        const row = event === 'DELETE' ? 'OLD' : 'NEW';
        return `IF ${when.replaceAll('ROW', row)} THEN SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = '${message}'; END IF;`;
      })
      .join(' ');
    await context.sequelize.query(
      `CREATE OR REPLACE TRIGGER ${name} BEFORE ${event} ON ${table} FOR EACH ROW BEGIN ${checks} END`,
    );
  }
}

export async function allowAgain(context: QueryInterface, refusals: Refusal[]): Promise<void> {
  for (const name of grouped(refusals).keys())
    await context.sequelize.query(`DROP TRIGGER IF EXISTS ${name}`);
}

function grouped(refusals: Refusal[]) {
  const groups = new Map<string, (Refusal & { event: Event })[]>();
  for (const refusal of refusals)
    for (const event of refusal.on) {
      const name = nameOf(refusal.table, event);
      groups.set(name, [...(groups.get(name) ?? []), { ...refusal, event }]);
    }
  return groups;
}
