/**
 * Plain data of a page as one text: the page's scripts read it when they need it, and until then it costs nothing. As an
 * object it would be gone through, value for value, while the page is being opened.
 */
export type Packed<T> = string & { readonly packed?: T }

export const packed = <T>(value: T): Packed<T> => JSON.stringify(value)

export const unpacked = <T>(text: Packed<T>): T => JSON.parse(text)
