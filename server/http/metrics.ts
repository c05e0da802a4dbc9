import { createServer, type Server } from 'node:http'
import { collectDefaultMetrics, Counter, Gauge, Histogram, Registry } from 'prom-client'
import type { DataSource } from 'typeorm'
import { poolOf } from '../db/pool-of.ts'

export interface Metrics {
  readonly registry: Registry
  readonly requests: Histogram<'endpoint' | 'status'>
  readonly jobs: Counter<'kind' | 'outcome'>
}

/** Figures for a monitor, of one process. Endpoints by name, never by address: addresses may hold secrets. */
export function createMetrics(database: DataSource): Metrics {
  const registry = new Registry()
  collectDefaultMetrics({ register: registry, prefix: 'foldgauge_' })
  const pool = poolOf(database)
  new Gauge({
    name: 'foldgauge_database_connections',
    help: 'Connections of this process by state',
    labelNames: ['state'],
    registers: [registry],
    collect() {
      this.set({ state: 'open' }, pool.totalCount)
      this.set({ state: 'idle' }, pool.idleCount)
      this.set({ state: 'waiting' }, pool.waitingCount)
    },
  })
  return {
    registry,
    requests: new Histogram({
      name: 'foldgauge_request_seconds',
      help: 'Time to answer by endpoint and status',
      labelNames: ['endpoint', 'status'],
      buckets: [0.005, 0.02, 0.05, 0.1, 0.3, 1, 3, 10],
      registers: [registry],
    }),
    jobs: new Counter({
      name: 'foldgauge_jobs_total',
      help: 'Jobs by kind and outcome',
      labelNames: ['kind', 'outcome'],
      registers: [registry],
    }),
  }
}

/** Serves figures on loopback, on a port of its own that no proxy forwards. */
export function serveMetrics(registry: Registry, port: number): Promise<Server> {
  const server = createServer((request, response) => {
    if (request.url !== '/metrics') {
      response.writeHead(404).end()
      return
    }
    registry.metrics().then(
      (text) => response.writeHead(200, { 'content-type': registry.contentType }).end(text),
      () => response.writeHead(500).end(),
    )
  })
  return new Promise((fulfil, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => fulfil(server))
  })
}
