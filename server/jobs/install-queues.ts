import type { DataSource } from 'typeorm'
import { deadLetter, jobKinds } from './job-kinds.ts'
import { createBoss } from './job-queue.ts'

/** Makes the queue's own tables and every queue; a queue that was never made would swallow jobs silently. */
export async function installQueues(database: DataSource): Promise<void> {
  const boss = createBoss(database, { migrate: true, isWorking: false })
  await boss.start()
  try {
    const known = new Set((await boss.getQueues()).map(({ name }) => name))
    if (!known.has(deadLetter))
      await boss.createQueue(deadLetter, { name: deadLetter, retryLimit: 0, retentionDays: 60 })
    for (const [name, settings] of Object.entries(jobKinds)) {
      const { retryLimit, retryDelay, expireInSeconds } = settings
      const options = { name, retryLimit, retryDelay, retryBackoff: true, expireInSeconds, deadLetter }
      if (known.has(name)) await boss.updateQueue(name, options)
      else await boss.createQueue(name, options)
    }
  } finally {
    await boss.stop({ graceful: false })
  }
}
