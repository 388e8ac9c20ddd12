// `npm test`: all the set-up, then every test. Arguments go to vitest: `npm test -- tests/browser`.
// The last line is always `N passed, N failed`.

import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { startChild, stopChild } from './steps/child.mjs'
import { runCommand } from './steps/lifetime.mjs'
import { root } from './steps/paths.mjs'
import { prepareToTest } from './steps/prepare-to-test.mjs'
import { line } from './steps/progress.mjs'
import { countResults, summaryLine } from './steps/test-summary.mjs'

let results = { passed: 0, failed: 1 }

await runCommand(
  async (life) => {
    const { env, localFolder } = await prepareToTest(life, root)
    const report = path.join(localFolder, 'test-results.json')
    fs.rmSync(report, { force: true })
    const vitest = path.join(root, 'node_modules/vitest/vitest.mjs')
    const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
    const tests = startChild(
      life,
      process.execPath,
      [vitest, 'run', ...reporters, ...process.argv.slice(2)],
      {
        cwd: root,
        env,
        stdio: ['ignore', 'inherit', 'inherit'],
      },
    )
    life.atEnd(() => stopChild(tests))
    const { code } = await tests.ended
    results = countResults(readReport(report), code)
    return results.failed > 0 ? 1 : 0
  },
  { lastWords: () => line(summaryLine(results)) },
)

function readReport(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'))
  } catch {
    return null
  }
}
