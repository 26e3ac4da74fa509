/** Keeps an open page up to date: asks anew when the server says that something changed. */
export function useLiveRefresh(address: string, refresh: () => Promise<unknown>) {
  const connected = ref(true)
  let source: EventSource | null = null
  onMounted(() => {
    source = new EventSource(address)
    source.addEventListener('changed', () => void refresh())
    source.addEventListener('open', () => {
      if (!connected.value) void refresh()
      connected.value = true
    })
    source.addEventListener('error', () => connected.value = false)
  })
  onBeforeUnmount(() => source?.close())
  return { connected }
}
