// Writes a migration with what the entities say and the database does not: tsx server/dev/write-migration.ts NAME
import { writeFileSync } from 'node:fs'
import { createDataSource } from '../db/data-source.ts'

const [name = 'change'] = process.argv.slice(2)
const url = process.env['DATABASE_URL']
if (url === undefined) throw new Error('Set DATABASE_URL to a database with every earlier migration.')
const database = await createDataSource(url).initialize()
const { upQueries, downQueries } = await database.driver.createSchemaBuilder().log()
await database.destroy()

const time = String(Date.now())
const title = name.replace(/(^|-)([a-z])/g, (_, __, letter: string) => letter.toUpperCase())
const call = ({ query, parameters }: { query: string; parameters?: unknown[] | undefined }): string => {
  const text = query.includes('`') ? JSON.stringify(query) : `\`${query}\``
  return `    await runner.query(${text}${parameters === undefined || parameters.length === 0 ? '' : `, ${JSON.stringify(parameters)}`})`
}
const file = `server/db/migrations/${time}-${name}.ts`
writeFileSync(
  file,
  `import type { MigrationInterface, QueryRunner } from 'typeorm'

export class ${title}${time} implements MigrationInterface {
  readonly name = '${title}${time}'

  async up(runner: QueryRunner): Promise<void> {
${upQueries.map(call).join('\n')}
  }

  async down(runner: QueryRunner): Promise<void> {
${downQueries.toReversed().map(call).join('\n')}
  }
}
`,
)
console.error(`${file}: ${String(upQueries.length)} statements; add it to migration-registry.ts`)
