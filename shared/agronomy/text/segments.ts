/** How many parts a text message takes: GSM 03.38 characters, or UCS-2 when one does not fit (3GPP TS 23.038). */

const BASIC = '@£$¥èéùìòÇ\nØø\rÅåΔ_ΦΓΛΩΠΨΣΘΞÆæßÉ !"#¤%&\'()*+,-./0123456789:;<=>?¡ABCDEFGHIJKLMNOPQRSTUVWXYZÄÖÑÜ§¿abcdefghijklmnopqrstuvwxyzäöñüà'
const EXTENSION = '^{}\\[~]|€\f'
const basic = new Set(BASIC)
const extension = new Set(EXTENSION)

export interface Segments {
  encoding: 'GSM-7' | 'UCS-2'
  /** septets, or UTF-16 units */
  units: number
  parts: number
  /** characters that force UCS-2, each once */
  forcedBy: string[]
}

/**
 * Units and parts of a message. A character of two units is never split over parts.
 * @returns 1 part for an empty text
 */
export function segments(text: string): Segments {
  const characters = [...text]
  const forcedBy = [...new Set(characters.filter(character => !basic.has(character) && !extension.has(character)))]
  const gsm = forcedBy.length === 0
  const sizes = characters.map(character => gsm ? (extension.has(character) ? 2 : 1) : character.length)
  const units = sizes.reduce((sum, size) => sum + size, 0)
  const [single, part] = gsm ? [160, 153] : [70, 67]
  return { encoding: gsm ? 'GSM-7' : 'UCS-2', units, parts: units <= single ? 1 : countParts(sizes, part), forcedBy }
}

function countParts(sizes: readonly number[], room: number): number {
  let [parts, used] = [1, 0]
  for (const size of sizes) {
    if (used + size > room) {
      parts++
      used = 0
    }
    used += size
  }
  return parts
}
