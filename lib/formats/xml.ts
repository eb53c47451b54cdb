/** Text as it may stand in XML, between tags and in attributes. */

const ENTITIES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }

export const xml = (text: string): string => text.replace(/[&<>"]/g, (sign) => ENTITIES[sign] ?? sign)
