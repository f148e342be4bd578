import { defineNitroPlugin, useRuntimeConfig } from 'nitropack/runtime'
import { sweep } from '../utils/regimen/sweep'

const EVERY_MS = 60_000

/** Looks every minute what time has brought about. A failure is said and tried again: it must not end the server. */
export default defineNitroPlugin((nitroApp) => {
  const origin = useRuntimeConfig().origin || `http://localhost:${process.env.PORT ?? 3000}`
  const look = () => {
    try {
      sweep(new Date(), origin)
    }
    catch (error) { console.error('Approvals could not be looked through.', error) }
  }
  const first = setTimeout(look, 1000)
  const timer = setInterval(look, EVERY_MS)
  first.unref()
  timer.unref()
  nitroApp.hooks.hook('close', () => {
    clearTimeout(first)
    clearInterval(timer)
  })
})
