/** Programs of other people that check our files where they are installed; elsewhere their tests are skipped and say why. */
import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { TestContext } from 'vitest'

/** Skips the test where the program cannot be started. */
export function needs(context: TestContext, program: string, probe: readonly string[] = ['--version']): void {
  const { error } = spawnSync(program, probe, { stdio: 'ignore' })
  if (error) context.skip(`${program} is not installed here`)
}

/** What a program says, given files by name in an empty folder in which it runs. */
export function run(
  program: string,
  args: readonly string[],
  files: Readonly<Record<string, string | Uint8Array>> = {},
  collect?: (folder: string) => void,
) {
  const folder = mkdtempSync(join(tmpdir(), 'longhence-'))
  try {
    for (const [name, content] of Object.entries(files)) writeFileSync(join(folder, name), content)
    const { status, stdout, stderr } = spawnSync(program, args, { cwd: folder, encoding: 'utf8', timeout: 60_000 })
    collect?.(folder)
    return { status, said: stdout, complaint: stderr }
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
