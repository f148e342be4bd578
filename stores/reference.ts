import type { EquationItem, FoodItem, ReferenceList, SourceItem, SpeciesItem } from '#shared/types/reference'

/** Reference data as the API gives it, loaded once each. */
export const useReferenceStore = defineStore('reference', () => {
  const edition = ref('')
  const species = ref<SpeciesItem[]>([])
  const foods = ref<FoodItem[]>([])
  const equations = ref<EquationItem[]>([])
  const sources = ref<SourceItem[]>([])
  const failed = ref(false)

  async function load<Item>(into: Ref<Item[]>, path: string) {
    if (into.value.length > 0) return
    try {
      const list = await $fetch<ReferenceList<Item>>(`/api/reference/${path}`)
      into.value = list.items
      edition.value = list.edition
      failed.value = false
    }
    catch { failed.value = true }
  }

  const speciesById = computed(() => new Map(species.value.map(one => [one.id, one])))
  const sourceByKey = computed(() => new Map(sources.value.map(one => [one.key, one])))

  return {
    edition, species, foods, equations, sources, failed, speciesById, sourceByKey,
    loadSpecies: () => load(species, 'species'),
    loadFoods: () => load(foods, 'foods'),
    loadEquations: () => load(equations, 'equations'),
    loadSources: () => load(sources, 'sources'),
  }
})
