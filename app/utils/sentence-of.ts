/** What a failed request said, in its own words where it has some. */
export function sentenceOf(error: unknown): string {
  const data = (error as { data?: { error?: { message?: string } } }).data
  return data?.error?.message ?? 'The server can\'t be reached. Check the signal, then try again.'
}
