/** What a sheet may not be without. A vague order feeds nobody: it is refused, with a list of what is missing. */
import type { Plan, PlanDay } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { SheetRefusedError } from './options'

/** @returns what is missing, in plain words; empty when the sheet may be printed. */
export function missingFor(plan: Plan, days: readonly PlanDay[]): string[] {
  const missing: string[] = []
  const need = (present: boolean, what: string) => {
    if (!present && !missing.includes(what)) missing.push(what)
  }
  need(said(plan.animal.speciesName), 'the species')
  need(isPositive(plan.animal.weightG), 'the weight')
  need(Number.isFinite(plan.animal.feedingTemperatureC.low), 'the temperature to feed at')

  if (plan.gate.state !== 'feed') need(plan.gate.findings.some(finding => said(finding.title)), 'the reason not to feed yet')
  // Behind a closed gate nothing is ordered, so nothing more is needed.
  if (plan.gate.state === 'do-not-feed') return missing

  for (const day of days) {
    const when = formatDay(day.date)
    if (day.state !== 'feed') {
      need(said(day.stateReason), `the reason not to feed on ${when}`)
      continue
    }
    need(said(plan.feed.name), 'the name of the feed')
    need(day.feeds.length > 0, `how much to give on ${when}`)
    need(said(day.strengthLabel), `the strength on ${when}`)
    for (const feed of day.feeds) {
      need(isPositive(feed.volumeMl) && isPositive(feed.markMl) && feed.draws >= 1, `how much to give on ${when}`)
      need(isPositive(feed.syringe.capacityMl) && isPositive(feed.syringe.stepMl), `the syringe on ${when}`)
      need(/^\d{2}:\d{2}$/.test(feed.localTime), `how often and when on ${when}`)
    }
    need(said(plan.routeLabel) && plan.howToGive.some(said), 'how to give it')
    need(plan.stopSigns.some(said) && isPositive(plan.validity.stopWeightG), 'when to stop and call')
    need(said(plan.validity.goodUntil), 'how long the weight holds')
  }
  return missing
}

/** @throws SheetRefusedError with everything that is missing at once. */
export function refuseIncomplete(plan: Plan, days: readonly PlanDay[]): void {
  const missing = missingFor(plan, days)
  if (missing.length > 0) throw new SheetRefusedError(missing)
}

function said(text: string): boolean {
  return text.trim() !== ''
}

function isPositive(value: number): boolean {
  return Number.isFinite(value) && value > 0
}
