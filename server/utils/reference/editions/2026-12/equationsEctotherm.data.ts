import { cited } from '../../record'
import { defineEquation } from '../../defineEquation'
import { AMPHIBIANS, bodyTemperature, grams, kilograms, REPTILES, SQUAMATES } from './equationDrafts'

const Q10 = {
  cited: cited({ value: 2.4, unit: 'times per 10 deg C', sourceKey: 'andrews1985', locator: 'Eq. 2, temperature term: 10^(0.038 x 10) = 2.40', howRead: 'computed', note: 'Taken from squamates. Not safe into the cold: hatchling turtles show 3.6 to 9.7 under 25 deg C.' }),
  meaning: 'how many times faster per 10 deg C',
}

/** Energy of reptiles and amphibians, as published. */
export const ectothermEnergyEquations = [
  // Reptiles, nutrition sheet 1.5.
  defineEquation({
    id: 'andrews-pough-1985', topic: 'energy', title: 'Resting rate of lizards and snakes at their body temperature',
    expression: '0.013 * g ^ 0.8 * 10 ^ (0.038 * T) * 10 ^ (0.14 * S)',
    variables: [grams(0.05, 200000), bodyTemperature(1, 50), { name: 'S', meaning: 'state: 0 standard (fasted, in its inactive time), 1 resting (fasted, in its active time)', unit: '0 or 1', low: 0, high: 1 }],
    taxon: 'squamates, adults', groups: SQUAMATES, basis: 'resting', holdsAtC: null, temperatureTerm: 'in-equation', resultUnit: 'mL O2/h',
    provenance: { sourceKey: 'andrews1985', locator: 'Eq. 2', howRead: 'restated', note: 'The 0.14 of the state term is from memory; resting is 1.38 times standard.' },
    notes: ['Open implementations keep the temperature to 1 to 50 deg C; the range of the data was not seen.', 'With S = 1 it is a usable stand-in for quiet tortoises: at 25.5 deg C 4.84 kcal a day for 1 kg against 5.24 measured.', 'Boas and pythons (34 species, 2 g to 67.8 kg): exponent 0.806 and 2.61 to 2.65 times per 10 deg C agree with it.'],
  }),
  defineEquation({
    id: 'bennett-dawson-1976', topic: 'energy', title: 'Standard rate of reptiles at 30 deg C, all pooled',
    expression: '0.278 * g ^ 0.77', variables: [grams(0.05, 200000)],
    taxon: 'reptiles', groups: REPTILES, basis: 'standard', holdsAtC: 30, temperatureTerm: 'none', resultUnit: 'mL O2/h',
    provenance: { sourceKey: 'bennett1976', locator: 'equation for all reptiles at 30 deg C', howRead: 'memory' },
  }),
  defineEquation({
    id: 'hughes-1971-tortoise', topic: 'energy', title: 'Resting rate of tortoises at their body temperature',
    expression: '45.47 * M ^ 0.82 * Q10 ^ ((T - Tmeasured) / 10)', variables: [kilograms(0.001, 600), bodyTemperature(15, 40)],
    constants: { Q10, Tmeasured: { cited: cited({ value: 25.5, unit: 'deg C', sourceKey: 'hughes1971', locator: 'abstract', howRead: 'original' }), meaning: 'temperature it was measured at' } },
    taxon: 'Aldabra giant tortoise, quiet', groups: ['chelonian'], basis: 'resting', holdsAtC: 25.5, temperatureTerm: 'q10', resultUnit: 'mL O2/h',
    provenance: { sourceKey: 'hughes1971', locator: 'abstract, quiet animals', howRead: 'original' },
    notes: ['Measured on animals of 0.118 to 35.5 kg at 25.5 deg C; the step to other temperatures is ours.', 'Hermann\'s tortoises measured somewhat lower.', 'There is an equation of its own for turtles (Ultsch 2013); its coefficients were not seen.'],
  }),
  defineEquation({
    id: 'hughes-1971-tortoise-active', topic: 'energy', title: 'Rate of tortoises while they are active, at 25.5 deg C',
    expression: '140.8 * M ^ 0.97', variables: [kilograms(0.001, 600)],
    taxon: 'Aldabra giant tortoise, active', groups: ['chelonian'], basis: null, holdsAtC: 25.5, temperatureTerm: 'none', resultUnit: 'mL O2/h',
    provenance: { sourceKey: 'hughes1971', locator: 'abstract, active animals', howRead: 'original' },
    notes: ['A rate while moving, not a day\'s need. Never a target for feeding.'],
  }),
  defineEquation({
    id: 'seymour-2013-crocodile', topic: 'energy', title: 'Resting rate of crocodiles at their body temperature',
    expression: '1.01 * M ^ 0.829 * Q10 ^ ((T - Tmeasured) / 10)', variables: [kilograms(0.01, 1200), bodyTemperature(15, 40)],
    constants: { Q10, Tmeasured: { cited: cited({ value: 30, unit: 'deg C', sourceKey: 'seymour2013', locator: 'abstract', howRead: 'original' }), meaning: 'temperature it was measured at' } },
    taxon: 'saltwater crocodile', groups: ['crocodilian'], basis: 'resting', holdsAtC: 30, temperatureTerm: 'q10', resultUnit: 'mL O2/min',
    provenance: { sourceKey: 'seymour2013', locator: 'abstract', howRead: 'original' },
    notes: ['Oxygen per minute, unlike most others, which are per hour.', 'Measured on animals of 0.19 to 389 kg at 30 deg C; the step to other temperatures is ours.', 'Freshwater crocodiles and American alligators run about a quarter lower (ratio 1.36, Gienger 2017).'],
  }),
  defineEquation({
    id: 'gillooly-2001-reptile', topic: 'energy', title: 'Resting rate of reptiles at their body temperature, from general theory',
    expression: 'exp(-8780 / (T + 273.15) + 26.85) * g ^ 0.75 / 60', variables: [grams(0.05, 200000), bodyTemperature(1, 50)],
    taxon: 'reptiles', groups: REPTILES, basis: 'resting', holdsAtC: null, temperatureTerm: 'in-equation', resultUnit: 'W',
    provenance: { sourceKey: 'gillooly2001', locator: 'reptiles; coefficients and check values in open tests', howRead: 'restated' },
  }),
  defineEquation({
    id: 'reptile-k10-37c', topic: 'energy', title: 'Minimum energy cost of reptiles at 37 deg C, K = 10',
    expression: '10 * M ^ 0.75', variables: [kilograms(0.00005, 1200)],
    taxon: 'reptiles', groups: REPTILES, basis: 'resting', holdsAtC: 37, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'reptilek10', locator: 'energy-group constants used in exotic practice', howRead: 'restated' },
    notes: ['Holds at 37 deg C only: at 28 deg C the same animal rests at about half of it.', 'A page prints it in kilojoules and grams. Read that way it is 42.5 times too high at every weight.'],
  }),
  defineEquation({
    id: 'donoghue-32-077', topic: 'energy', title: 'Maintenance of reptiles at 30 deg C, an older veterinary formula',
    expression: '32 * M ^ 0.77', variables: [kilograms(0.00005, 1200)],
    taxon: 'reptiles', groups: REPTILES, basis: 'maintenance', holdsAtC: 30, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'mader2006', locator: 'nutrition chapter', howRead: 'memory', note: 'The 32 was also seen with exponents 0.75 and 0.76.' },
    notes: ['Called standard or maintenance by different authors. It is 4 to 5 times the measured resting rate at 30 deg C and above the whole day of a free animal at every weight under about 26 kg. Shown to compare, never a default.'],
  }),
  defineEquation({
    id: 'donoghue-32-075', topic: 'energy', title: 'Maintenance of tortoises, turtles and snakes at 30 deg C, an older veterinary formula',
    expression: '32 * M ^ 0.75', variables: [kilograms(0.00005, 1200)],
    taxon: 'chelonians and snakes', groups: ['chelonian', 'snake'], basis: 'maintenance', holdsAtC: 30, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'edur', locator: 'articles on turtles and on snakes', howRead: 'restated' },
    notes: ['Said to be "maintenance derived from standard rate"; far above measured rates, as the formula with 0.77 is.'],
  }),
  defineEquation({
    id: 'k-reptile', topic: 'energy', title: 'Minimum energy cost, reptiles (K table)',
    expression: '10 * M ^ 0.75', variables: [kilograms(0.00005, 1200)],
    taxon: 'reptiles', groups: [], basis: 'resting', holdsAtC: 37, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'reptilek10', locator: 'K table; temperature from memory', howRead: 'restated' },
    notes: ['The row of the K table. Plans offer the same formula as reptile-k10-37c.'],
  }),
  defineEquation({
    id: 'nagy-1999-reptile', topic: 'energy', title: 'A whole free-living day of a reptile',
    expression: '0.196 * g ^ 0.889', variables: [grams(0.05, 1200000)],
    taxon: 'reptiles, 55 species', groups: REPTILES, basis: 'field', holdsAtC: null, temperatureTerm: 'none', resultUnit: 'kJ/day',
    provenance: { sourceKey: 'nagy2005', locator: 'field metabolic rate, reptiles', howRead: 'restated' },
    notes: ['Doubly labelled water; body temperature as it varies in the wild.', 'The smallest value measured was 0.23 kJ a day, in a gecko. Lizards run at 2 to 2.5 times their resting rate.'],
  }),

  // Amphibians, nutrition sheet 1.6.
  defineEquation({
    id: 'gillooly-2001-amphibian', topic: 'energy', title: 'Resting rate of amphibians at their body temperature, from general theory',
    expression: 'exp(-5760 / (T + 273.15) + 16.68) * g ^ 0.75 / 60', variables: [grams(0.05, 30000), bodyTemperature(1, 50)],
    taxon: 'amphibians', groups: AMPHIBIANS, basis: 'resting', holdsAtC: null, temperatureTerm: 'in-equation', resultUnit: 'W',
    provenance: { sourceKey: 'gillooly2001', locator: 'amphibians; coefficients in open tests', howRead: 'restated' },
    notes: ['Salamanders run lower, lungless ones lowest.'],
  }),
  defineEquation({
    id: 'wright-whitaker-anuran-25', topic: 'energy', title: 'Standard rate of frogs and toads at 25 deg C',
    expression: '0.02 * g ^ 0.84', variables: [grams(0.05, 30000)],
    taxon: 'frogs and toads', groups: ['amphibian-anuran'], basis: 'standard', holdsAtC: 25, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'wright2001', locator: 'table of rates by temperature', howRead: 'memory' },
  }),
  defineEquation({
    id: 'wright-whitaker-caudate-25', topic: 'energy', title: 'Standard rate of salamanders at 25 deg C',
    expression: '0.01 * g ^ 0.8', variables: [grams(0.05, 30000)],
    taxon: 'salamanders', groups: ['amphibian-caudate'], basis: 'standard', holdsAtC: 25, temperatureTerm: 'none', resultUnit: 'kcal/day',
    provenance: { sourceKey: 'wright2001', locator: 'table of rates by temperature', howRead: 'memory' },
  }),
]
