import { mayDo, type Permission, type Role } from '#shared/utils/permissions'

interface Me {
  person: { id: string, name: string, email: string } | null
  farms: { slug: string, name: string, role: Role, invented: boolean }[]
}

/** Who is signed in and to which farms they belong; asked once, and the same on the server and in the browser. */
export const useMeStore = defineStore('me', () => {
  const person = ref<Me['person']>(null)
  const farms = ref<Me['farms']>([])
  const asked = ref(false)

  /** Asks when nobody has asked before. @throws {FetchError} when the server can't be reached or fails */
  async function load(): Promise<void> {
    if (asked.value) return
    const me = await useRequestFetch()<Me>('/api/auth/me')
    person.value = me.person
    farms.value = me.farms
    asked.value = true
  }

  const farm = (slug: string) => farms.value.find(other => other.slug === slug)
  /** For what a page offers; the server decides. */
  function may(slug: string, permission: Permission): boolean {
    const role = farm(slug)?.role
    return role !== undefined && mayDo(role, permission)
  }

  return { person, farms, asked, load, farm, may }
})
