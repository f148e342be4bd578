import { nextMailAt } from '../data/mailRows'
import { sendDueMails, type MailRun } from './sendDueMails'

export interface MailWorkerOptions extends Pick<MailRun, 'db' | 'transport' | 'retrySeconds' | 'now'> { /** Longest sleep. */ everyMs?: number }

const EVERY_MS = 5000
const SHORTEST_SLEEP_MS = 200
const GRACE_MS = 5000

let current: { wake: () => void } | null = null

/** Sends mails in the background, one worker per process. Stopping lets the mail on its way arrive and starts no other. */
export function startMailWorker(options: MailWorkerOptions): { stop: () => Promise<void> } {
  const { db, transport, retrySeconds, now = () => new Date(), everyMs = EVERY_MS } = options
  let stopped = false
  let again = false
  let timer: NodeJS.Timeout | undefined
  let round: Promise<void> | null = null

  const sleep = () => {
    if (stopped) return
    timer = setTimeout(wake, sleepMs())
    timer.unref()
  }
  const sleepMs = () => {
    try {
      const next = nextMailAt(db)
      return next === null ? everyMs : Math.min(everyMs, Math.max(SHORTEST_SLEEP_MS, Date.parse(next) - now().getTime()))
    }
    catch {
      return everyMs
    }
  }
  const work = async () => {
    do {
      again = false
      const { problems } = await sendDueMails({ db, transport, retrySeconds, now, stopped: () => stopped })
      if (problems > 0) console.warn(`Mail: ${problems} ${problems === 1 ? 'mail' : 'mails'} could not be sent. The outbox says why.`)
    } while (again && !stopped)
    round = null
    sleep()
  }
  function wake() {
    if (stopped) return
    again = round !== null
    if (round) return
    clearTimeout(timer)
    // After what is running now: a transaction that has just queued the mail commits first, and no request waits.
    round = new Promise<void>(resolve => setImmediate(resolve)).then(work)
  }

  const worker = { wake }
  current = worker
  wake()
  return {
    async stop() {
      stopped = true
      clearTimeout(timer)
      if (current === worker) current = null
      await withinGrace(round)
      transport.close()
    },
  }
}

/** Call it after queueing a mail, so that it leaves at once. Does nothing without a mail service. */
export function wakeMailWorker(): void {
  current?.wake()
}

/** Whether mails leave this server; `hasService` of `insertMail`. */
export function hasMailService(): boolean {
  return current !== null
}

/** The mail on its way gets this long; what then breaks off is due again when its claim ends. */
async function withinGrace(round: Promise<void> | null): Promise<void> {
  let timer: NodeJS.Timeout | undefined
  await Promise.race([round, new Promise((resolve) => {
    timer = setTimeout(resolve, GRACE_MS)
  })])
  clearTimeout(timer)
}
