/** True for text that people can read: no control characters but line ends and tabs, none that turn the reading direction, no half characters. */
export function isPlainText(text: string): boolean {
  return !/[\p{Cc}\p{Cs}\u202A-\u202E\u2066-\u2069]/u.test(text.replaceAll(/[\n\r\t]/g, ''))
}
