import { defineNitroPlugin, useRuntimeConfig } from 'nitropack/runtime'
import { database } from '../db/client'
import { MailSettingsError, mailTransport, type MailTransport } from '../utils/mail/transport'
import { startMailWorker } from '../utils/mail/worker'

interface SmtpSettings { url: string, from: string, retrySeconds: number }

/** Sends the mails of the queue when a mail server is set; without one they are only kept. */
export default defineNitroPlugin((nitroApp) => {
  const smtp = useRuntimeConfig().smtp as SmtpSettings | undefined
  if (!smtp?.url) return
  if (!useRuntimeConfig().origin) throw new Error('Mail leaves this server, so NUXT_ORIGIN must say where people reach it, for example https://plans.rescue.example: links in mails begin with it.')
  const transport = transportOf(smtp.url, smtp.from)
  if (!transport) return
  const retrySeconds = Number(smtp.retrySeconds)
  const worker = startMailWorker({ db: database(), transport, retrySeconds: retrySeconds > 0 ? retrySeconds : 60 })
  nitroApp.hooks.hook('close', () => worker.stop())
})

/** A mistake in the settings of the mail must not keep anyone from a feeding plan: said once, and no mail leaves. */
function transportOf(url: string, from: string): MailTransport | null {
  try {
    return mailTransport({ url, from })
  }
  catch (error) {
    console.error(`Mail is off. ${error instanceof MailSettingsError ? error.message : 'The settings of the mail server are not understood.'}`)
    return null
  }
}
