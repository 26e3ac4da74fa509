/** The process answers. */
export default defineEventHandler((event) => {
  allowAnyone(event)
  return { alive: true }
})
