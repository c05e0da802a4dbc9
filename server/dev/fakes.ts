// Stand-ins for a mail server and an object store, in one process of their own. Tells its parent the addresses.
import { join } from 'node:path'
import { showMails, startMailFake } from './mail-fake.ts'
import { startObjectStoreFake } from './object-store-fake.ts'

const [folder = '.data', mailPort = '0'] = process.argv.slice(2)

const mail = await startMailFake(0, join(folder, 'mail.jsonl'))
const shown = await showMails(mail, Number(mailPort))
const store = await startObjectStoreFake(join(folder, 'objects'))
process.send?.({ smtp: mail.url, mails: shown.url, objects: store.url })

const stop = (): void => {
  shown.stop()
  store.server.closeAllConnections()
  store.server.close()
  void mail.stop()
  if (process.connected) process.disconnect()
}
for (const event of ['SIGINT', 'SIGTERM', 'disconnect'] as const) process.once(event, stop)
