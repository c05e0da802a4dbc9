import 'reflect-metadata'
import { DataSource } from 'typeorm'
import { entities } from './entity-registry.ts'
import { migrations } from './migrations/migration-registry.ts'
import { namingStrategy } from './naming-strategy.ts'

/** A connection pool to the database. Its schema comes from migrations alone. */
export function createDataSource(url: string, poolSize = 10): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    entities,
    migrations: [...migrations],
    migrationsTableName: 'migration',
    namingStrategy,
    synchronize: false,
    logging: false,
    applicationName: 'foldgauge',
    extra: { max: poolSize, connectionTimeoutMillis: 10_000, idleTimeoutMillis: 30_000 },
  })
}
