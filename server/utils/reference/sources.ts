import type { SourceItem } from '#shared/types/reference'

// `seen` says what was read, not what exists: "abstract" means nobody opened the paper for us.
const ABSTRACT = 'abstract'
const BOOK_PAGE = 'page scans of the pages named'
const RESTATED_IN_CODE = 'restated with coefficients and check values in the documentation and tests of an open ecology package'
const NOT_SEEN = 'not seen; the number is from memory'
const INDUSTRY = 'industry-hosted veterinary education article; the host is not named because it sells feed'

/** [key, kind, authors, year, title, where, seen, errata] */
type Row = [string, SourceItem['kind'], string, number | null, string, string, string, string[]?]

const rows: Row[] = [
  // Not publications
  ['house-rule', 'house-rule', 'This product', 2026, 'House rules', 'rules and data of the edition', 'our own choices, each with its reason'],
  ['common-practice', 'practice', 'Keepers and rescue workers', null, 'Common practice of the trade', 'no publication', 'told, with no source behind it'],
  ['memory', 'practice', 'General handbooks', null, 'From memory of general handbooks', 'no page', 'not seen in a text; check before relying on it'],
  ['demo', 'demo', 'This product', 2026, 'Invented for the demonstration', 'demonstration feeds', 'no such feed exists'],
  ['definition', 'definition', 'International definitions', null, 'Definitions of units and formulas', 'exact or by definition', 'definition'],

  // Mammals
  ['kleiber1961', 'book', 'Kleiber', 1961, 'The Fire of Life; also Physiological Reviews 27:511-541 (1947)', 'Table 7.3 and the 3/4-power law', 'restated in Hand et al. 2010, Table 5-2 (293 M^0.75 kJ)'],
  ['sacn2010', 'book', 'Hand, Thatcher, Remillard, Roudebush, Novotny (eds)', 2010, 'Small Animal Clinical Nutrition, 5th ed.', 'book', BOOK_PAGE, ['The dog of the weight-loss case is printed as 988 kcal/day at 34 kg; 70 M^0.75 gives 985.6.']],
  ['wsava2018', 'guideline', 'World Small Animal Veterinary Association', 2018, 'World Congress proceedings 2018', 'pp. 290 (cat feeding example), 434 (fluid sums)', BOOK_PAGE],
  ['vnj2022', 'paper', 'Veterinary Nursing Journal', 2022, 'Table 2, energy factors after FEDIAF 2021', 'Veterinary Nursing Journal 37(4)', 'the table'],
  ['nrc2006', 'book', 'National Research Council', 2006, 'Nutrient Requirements of Dogs and Cats', 'book', '130 M^0.75 restated in a nursing journal; 95 M^0.75 from memory'],
  ['dawson1970', 'paper', 'Dawson & Hulbert', 1970, 'Standard metabolism, body temperature, and surface areas of Australian marsupials', 'American Journal of Physiology 218:1233-1238', 'restated in two versions of an open scaling library (2.36 W x M^0.737); paper not opened', ['Often quoted as 48.6 M^0.75 or 49 M^0.75. The exponent is 0.737: 48.7 M^0.737 kcal/day.']],
  ['johnson2014', 'paper', 'Johnson-Delaney', 2014, 'Review of captive marsupials', 'Veterinary Clinics of North America: Exotic Animal Practice', 'document excerpt: basal rate about two thirds of placental'],
  ['hill1984', 'page', 'Hill & Smith, quoted in a guide to rehabilitation of insectivorous bats', 1984, 'Whole-day energy of a 9 g bat', 'feeding chapter of the guide', 'the guide; the original was not opened'],
  ['azaotter', 'guideline', 'Association of Zoos and Aquariums', 2009, 'Otter (Lutrinae) Care Manual', 'p. 67, Table 12', 'the page', ['The year is from memory.']],
  ['lawler2008', 'paper', 'Lawler', 2008, 'Neonatal and pediatric care of the puppy and kitten', 'Theriogenology 70:384-392', 'a feeding table made after it', ['The table\'s capacity column prints about 3.5 mL per 100 g although its heading says 4: the heading is used.']],
  ['afrma2009', 'page', 'Rat and mouse fanciers\' club', 2009, 'Article on orphan rats', 'club magazine, 2009', 'the page, quoting rehabilitator-council manuals', ['Prints 3.75 mL and "75 %" for a 5 g pup at 15 mL per 100 g. It is 0.75 mL, 15 %.']],
  ['squirrel2011', 'page', 'Squirrel rehabilitation page', 2011, 'How to feed', 'squirrelrehabilitation.com', 'the page'],
  ['laflamme1997', 'paper', 'Laflamme', 1997, 'Development and validation of a body condition score system', 'cited in a review article', 'the review', ['Derived mostly from ideal and fat animals; not shown to hold in very thin ones.']],
  ['cbicu', 'page', 'Clinician\'s Brief', null, 'Enteral and parenteral nutrition in the ICU; nutritional management nuances (abstract of Zoran 2003)', 'clinician magazine', 'the articles'],
  ['aaha2013', 'guideline', 'Davis et al.', 2013, 'AAHA/AAFP Fluid Therapy Guidelines for Dogs and Cats', 'Journal of the American Animal Hospital Association 49:149-159', 'toolkit pages and tables'],
  ['aaha2024', 'guideline', 'American Animal Hospital Association', 2024, 'AAHA Fluid Therapy Guidelines for Dogs and Cats', 'Journal of the American Animal Hospital Association 60, DOI 10.5326/JAAHA-MS-7444', 'abstract and summary pages; the tables were not seen'],
  ['infusionleaflet', 'page', 'Veterinary equipment supplier', null, 'Leaflet on infusion in rabbits and rodents', 'p. 7, citing Anaesthesia of Exotic Pets and Paul-Murphy 2007', 'the leaflet'],

  // Birds
  ['quesenberry1989', 'paper', 'Quesenberry, Mauldin & Hillyer', 1989, 'Nutritional support of the avian patient', 'Proceedings of the Association of Avian Veterinarians, pp. 11-19', 'reproduced on a page "Energy required for the avian patient"'],
  ['hrb2020', 'book', 'Duerr & Gage (eds)', 2020, 'Hand-Rearing Birds, 2nd ed.', 'book', BOOK_PAGE],
  ['lasiewski1967', 'paper', 'Lasiewski & Dawson', 1967, 'A re-examination of the relation between standard metabolic rate and body weight in birds', 'Condor 69:13-23', 'restated in an open scaling library; introduction of the paper', ['One code comment gives 3.6 W for birds other than songbirds; the other version and 78.3 kcal/day say 3.79 W.']],
  ['aschoff1970', 'paper', 'Aschoff & Pohl', 1970, 'Rhythmic variations in energy metabolism', 'Journal fuer Ornithologie 111:38-47', NOT_SEEN],
  ['mckechnie2004', 'paper', 'McKechnie & Wolf', 2004, 'The allometry of avian basal metabolic rate', 'Physiological and Biochemical Zoology 77:502-521', RESTATED_IN_CODE],
  ['carpenter2018', 'book', 'Carpenter & Marion (eds)', 2018, 'Exotic Animal Formulary, 5th ed.', 'Table 5-36 and the wildlife chapter', BOOK_PAGE],
  ['mcdonald2006', 'book', 'McDonald', 2006, 'Nutritional considerations, in Clinical Avian Medicine', 'Table 4.1.1', 'document excerpt', ['The year is from memory.']],
  ['edubirds', 'page', 'Veterinary education article', null, 'Tube feeding birds; fluid therapy in the avian patient', 'industry-hosted', INDUSTRY],

  // Reptiles and amphibians
  ['andrews1985', 'paper', 'Andrews & Pough', 1985, 'Metabolism of squamate reptiles: allometric and ecological relationships', 'Physiological Zoology 58:214-231', 'first page; coefficients restated in open ecology packages', [
    'The state term is 10^(0.14 S), S 0 or 1: resting is 1.38 times standard. Some programs write it as 10^S and tell the user to set 1 for resting, which makes it ten times too high. Never accept that.',
    'The 0.14 itself was not seen in print.',
  ]],
  ['bennett1976', 'book', 'Bennett & Dawson', 1976, 'Metabolism, in Biology of the Reptilia 5', 'pp. 127-223', NOT_SEEN],
  ['hughes1971', 'paper', 'Hughes, Gaymer, Moore & Woakes', 1971, 'Respiratory exchange and body size in the Aldabra giant tortoise', 'Journal of Experimental Biology 55:651-665', ABSTRACT],
  ['seymour2013', 'paper', 'Seymour et al.', 2013, 'Maximal and standard metabolism of the saltwater crocodile', 'Journal of Comparative Physiology B 183:491-500', ABSTRACT, ['Rates are per minute, unlike most others, which are per hour.']],
  ['gillooly2001', 'paper', 'Gillooly, Brown, West, Savage & Charnov', 2001, 'Effects of size and temperature on metabolic rate', 'Science 293:2248-2251', RESTATED_IN_CODE],
  ['reptilek10', 'page', 'Several keeper and clinic pages', null, 'Minimum energy cost of reptiles, 10 M^0.75 kcal/day at 37 deg C', 'energy-group constants used in exotic practice', 'the pages; no original paper was found', [
    'A reptile nutrition page prints "kJ/day = 10 x grams^0.75". It is kcal and kilograms: read literally it is 42.5 times too high at every weight.',
    'Several pages give no unit of weight at all. Kilograms.',
  ]],
  ['mader2006', 'book', 'Donoghue & Langenberg 1996; Donoghue 2006, in Mader (ed)', 2006, 'Reptile Medicine and Surgery', 'nutrition chapters', NOT_SEEN, ['32 M^0.77 is four to five times the measured resting rate at 30 deg C and above the whole-day field rate at every weight under 26 kg. Kept to be shown, never as a default.']],
  ['edur', 'page', 'Veterinary education articles', null, 'Nutritional support in reptiles; feeding the hospitalized turtle or tortoise; feeding the hospitalized snake', 'industry-hosted', INDUSTRY],
  ['wikivet', 'page', 'WikiVet', null, 'Snake supportive care', 'en.wikivet.net', 'the page'],
  ['educ', 'page', 'Veterinary education article', null, 'Fluid administration in amphibians', 'industry-hosted', INDUSTRY],
  ['wright2001', 'book', 'Wright & Whitaker (eds)', 2001, 'Amphibian Medicine and Captive Husbandry', 'tables of metabolic rate by temperature', NOT_SEEN],
  ['boxturtle', 'page', 'Assist-feeding handout', null, 'Assist feeding of eastern box turtles', 'handout', 'the handout; no trial behind it'],
  ['vetstream', 'page', 'Vetstream', null, 'Assisted feeding (reptile)', 'ISSN 2398-2985', 'the page'],
  ['vin2007', 'guideline', 'World Small Animal Veterinary Association', 2007, 'Hospital care of reptiles for nurses', 'congress proceedings 2007', 'the text'],
  ['throckmorton1973', 'paper', 'Throckmorton', 1973, 'Digestive efficiency in the herbivorous lizard Ctenosaura pectinata', 'Copeia', ABSTRACT, ['The year is from memory.']],
  
  // Field rates
  ['nagy2005', 'paper', 'Nagy; Nagy, Girard & Brown 1999', 2005, 'Field metabolic rate and body size', 'Journal of Experimental Biology 208:1621-1625; Annual Review of Nutrition 19:247-277', RESTATED_IN_CODE],

  // Length and condition
  ['peig2009', 'paper', 'Peig & Green', 2009, 'New perspectives for estimating body condition from mass/length data: the scaled mass index', 'Oikos 118:1883-1891', 'abstract and published code'],
  ['peig2010', 'paper', 'Peig & Green', 2010, 'The paradigm of body condition: a critical reappraisal of current methods based on mass and length', 'Functional Ecology 24:1323-1332', 'abstract and published code'],
  ['meiri2010', 'paper', 'Meiri', 2010, 'Length-weight allometries in lizards', 'Journal of Zoology 281:218-226', RESTATED_IN_CODE],
  ['pough1980', 'paper', 'Pough', 1980, 'The advantages of ectothermy for tetrapods', 'American Naturalist 115:92-112', RESTATED_IN_CODE],
  ['jackson1980', 'paper', 'Jackson', 1980, 'Weight and measurement data on tortoises (Testudo graeca and Testudo hermanni)', 'Veterinary Record, 1978 to 1980', 'restated on keeper pages', ['Straight-line length only. Wrong for other species; bladder water or eggs shift it, and a fat sick animal can pass.']],
  ['meiri2018', 'dataset', 'Meiri', 2018, 'Traits of lizards of the world', 'Global Ecology and Biogeography 27:1168; Dryad 10.5061/dryad.f6t39kj (CC0)', 'read through an R data package; its clade equations are credited there to Feldman et al. 2016'],
  ['myhrvold2015', 'dataset', 'Myhrvold, Baldridge, Chan, Sivam, Freeman & Ernest', 2015, 'An amniote life-history database', 'Ecology 96:3109 (CC0)', 'read through an R data package', ['Some values are maximum weights, small races or slips: savannah monitor 35,500 g, carpet python 15,926 g.']],
  ['anage', 'dataset', 'Tacutu et al.', 2018, 'AnAge, Human Ageing Genomic Resources', 'Nucleic Acids Research 46:D1083', 'read through an R data package', ['Some values are slips or odd samples: tiger salamander 9.4 g, red squirrel 600 g, savannah monitor 35,500 g.']],
  ['wilman2014', 'dataset', 'Wilman et al.', 2014, 'EltonTraits 1.0: species-level foraging attributes of the world\'s birds and mammals', 'Ecology 95:2027 (CC0)', 'read through an R data package'],
  ['oliveira2017', 'dataset', 'Oliveira, Sao-Pedro, Santos-Barrera, Penone & Costa', 2017, 'AmphiBIO, a global database for amphibian ecological traits', 'Scientific Data 4:170123 (CC BY)', 'read through an R data package'],

  // Conversions and foods
  ['trenchr', 'page', 'Open biophysical-ecology packages', null, 'Documentation and unit tests of open ecology packages', 'package documentation', 'the documentation'],
  ['hainsworth1981', 'book', 'Hainsworth', 1981, 'Animal Physiology: Adaptations in Function', 'metabolic water', 'restated in an open ecology package'],
  ['finke2002', 'paper', 'Finke', 2002, 'Complete nutrient composition of commercially raised invertebrates', 'Zoo Biology 21:269-285', 'abstract; the table as printed in Hand-Rearing Birds; calcium and phosphorus from memory'],
  ['usda-sr27', 'dataset', 'United States Department of Agriculture', 2014, 'National Nutrient Database for Standard Reference, release 27, abbreviated file', 'public copy of ABBREV.csv', 'the rows named'],
  ['atwater1900', 'paper', 'Atwater & Bryant', 1900, 'The availability and fuel value of food materials', 'general factors 4, 9, 4', NOT_SEEN],
  ['milks', 'page', 'Two documents on milk composition and kitten feeding', null, 'Energy of milks', 'kJ per litre; kitten formula after Lawler 2008', 'the documents'],

  // Guidelines, papers and pages on feeding and refeeding
  ['aaha2021', 'guideline', 'Cline et al.', 2021, 'AAHA Nutrition and Weight Management Guidelines', 'Journal of the American Animal Hospital Association 57:153-178', 'section on feeding plans for hospitalized patients'],
  ['wsava2017', 'guideline', 'Tully, in World Small Animal Veterinary Association', 2017, 'Avian fluid therapy', 'World Congress proceedings 2017, pp. 345-346', BOOK_PAGE],
  ['cook2021', 'paper', 'Cook et al.', 2021, 'Refeeding syndrome in 11 cats', 'Journal of Feline Medicine and Surgery 23:883-891', ABSTRACT],
  ['camacho2015', 'paper', 'Camacho et al.', 2015, 'Fluid therapy of 57 loggerhead turtles', 'PLoS ONE 10(7):e0132217', ABSTRACT],
  ['dibartola2012', 'book', 'DiBartola (ed)', 2012, 'Fluid, Electrolyte and Acid-Base Disorders in Small Animal Practice', 'pp. 22, 333, 346, 347', BOOK_PAGE, ['The year of the scanned edition is from memory.']],
  ['dvmhospital', 'page', 'Veterinary magazine', null, 'Nutritional support for hospitalized patients; feeding hospitalized patients for best clinical outcome', 'two articles', 'the articles'],
  ['merck', 'page', 'Merck/MSD Veterinary Manual', null, 'Care of orphaned native birds and mammals; body condition scores', 'merckvetmanual.com', 'the pages'],
  ['aap', 'guideline', 'American Academy of Pediatrics; CDC', null, 'Preventing transmission of Salmonella from reptiles; washing hands', 'table and leaflet', 'the table and the leaflet'],
  ['who2021', 'guideline', 'World Health Organization', 2021, 'Inpatient care of children with severe acute malnutrition: training course', 'module 4, Annexes A and C', 'rules and examples restated in an open human-health specification'],
  ['nice2006', 'guideline', 'National Institute for Health and Care Excellence', 2006, 'Nutrition support for adults (CG32)', 'nice.org.uk', 'restated in two published tables'],
  ['aspen2020', 'guideline', 'da Silva et al.', 2020, 'ASPEN consensus recommendations for refeeding syndrome', 'Nutrition in Clinical Practice 35:178-195', 'restated in two published tables'],
  ['infantbats', 'page', 'Rehabilitation document', null, 'Rearing infant bats', 'document', 'the document'],
  ['edumammals', 'page', 'Veterinary education article', null, 'Fluid administration in exotic companion mammals', 'industry-hosted', INDUSTRY],

  // Energy: seen, but used as a cross-check or for its exponent only
  ['bartges1999', 'paper', 'Bartges & Ritchie', 1999, 'Calculating the required volume of avian nutritional products', 'Compendium, August 1999', 'document excerpt'],
  ['harper2000', 'paper', 'Harper', 2000, 'Estimating the energy needs of pet birds', 'Journal of Avian Medicine and Surgery 14:95-102', ABSTRACT],
  ['chappell1987', 'paper', 'Chappell & Ellis', 1987, 'Resting metabolic rates in boid snakes', 'Journal of Comparative Physiology B 157:227-235', ABSTRACT],
  ['becklowe1994', 'paper', 'Beck & Lowe', 1994, 'Resting metabolism of helodermatid lizards', 'Journal of Comparative Physiology B 164:124-129', ABSTRACT],
  ['bennettnagy1977', 'paper', 'Bennett & Nagy', 1977, 'Energy expenditure in free-ranging lizards', 'Ecology, DOI 10.2307/1939022', ABSTRACT],
  ['gienger2017', 'paper', 'Gienger et al.', 2017, 'Standard metabolic rate of crocodilians', 'PLoS ONE 12:e0171082', ABSTRACT],
  ['mcnab2005', 'paper', 'McNab', 2005, 'Uniformity in the basal metabolic rate of marsupials', 'Revista Chilena de Historia Natural 78:183-198', ABSTRACT],
  ['feldman2013', 'paper', 'Feldman & Meiri', 2013, 'Length-mass allometry in snakes', 'Biological Journal of the Linnean Society 108:161-172', ABSTRACT],
  ['feldman2016', 'paper', 'Feldman, Sabath, Pyron, Mayrose & Meiri', 2016, 'Body sizes and diversification rates of lizards, snakes, amphisbaenians and the tuatara', 'Global Ecology and Biogeography 25:187-197', 'its clade equations as carried in a later data set'],

  // Standards
  ['iso7886', 'standard', 'International Organization for Standardization', 2017, 'ISO 7886-1:2017, corrected version 2019-08: sterile hypodermic syringes for single use, part 1', 'clause 8', 'table of contents; tolerances restated in an estimate of syringe accuracy (Phillips 2016), the rest from memory'],
]

function sourceItem([key, kind, authors, year, title, where, seen, errata = []]: Row): SourceItem {
  return Object.freeze({ key, kind, authors, year, title, where, seen, errata })
}

/**
 * Every source that the reference data cite, by key, with known errors of the source beside it.
 *
 * @returns map from key to source; keys are unique.
 * @source the sources themselves; `seen` says what of each was read
 * @example sources.get('andrews1985')!.errata[0] // 'The state term is 10^(0.14 S), …'
 */
export const sources: ReadonlyMap<string, SourceItem> = uniqueByKey(rows.map(sourceItem))

function uniqueByKey(items: SourceItem[]): ReadonlyMap<string, SourceItem> {
  const map = new Map(items.map(item => [item.key, item]))
  if (map.size !== items.length) throw new Error('Two sources in sources.ts have the same key.')
  return map
}
