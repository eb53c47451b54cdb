/** A stamp is a file with the hash of what something was made from: while both agree, it need not be made again. */
import { createHash } from 'node:crypto'
import { readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/**
 * Every file under a folder, as sorted paths from it.
 * @param {string} root
 * @param {(path: string) => boolean} wanted asked for files and folders alike
 * @returns {string[]}
 */
export function filesUnder(root, wanted, folder = '') {
  return readdirSync(join(root, folder), { withFileTypes: true })
    .map((entry) => ({ entry, path: folder ? `${folder}/${entry.name}` : entry.name }))
    .filter(({ path }) => wanted(path))
    .sort((one, other) => (one.path < other.path ? -1 : 1))
    .flatMap(({ entry, path }) => (entry.isDirectory() ? filesUnder(root, wanted, path) : [path]))
}

/**
 * One hash over names and contents, and over further words such as a version.
 * @param {string} root
 * @param {readonly string[]} paths
 * @param {readonly string[]} [words]
 */
export function hashOf(root, paths, words = []) {
  const hash = createHash('sha256').update(JSON.stringify(words))
  for (const path of paths) {
    const content = readFileSync(join(root, path))
    hash.update(`\0${path}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}

/** @param {string} file @param {string} hash */
export function isFresh(file, hash) {
  try {
    return readFileSync(file, 'utf8') === hash
  } catch {
    return false
  }
}

/** @param {string} file @param {string} hash */
export function setStamp(file, hash) {
  writeFileSync(file, hash)
}

/** @param {string} file */
export function clearStamp(file) {
  rmSync(file, { force: true })
}
