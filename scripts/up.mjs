/** Everything between a fresh copy and a running product. Needs Node and npm, nothing installed. */
import { build } from './steps/build.mjs'
import { publicAddress, writeEnvFile } from './steps/env-file.mjs'
import { install } from './steps/install.mjs'
import { checkNode } from './steps/node-version.mjs'
import { runScript, tellTrouble } from './steps/run.mjs'
import { checkPort, serve, waitUntilWell } from './steps/serve.mjs'

await tellTrouble(async () => {
  const port = Number(process.env.PORT ?? 3000)
  checkNode()
  await checkPort(port)
  await install()
  writeEnvFile()
  const env = { PUBLIC_ADDRESS: publicAddress(port) }
  await runScript('scripts/migrate.ts', env)
  await runScript('scripts/seed.ts', env)
  await build({ onlyIfChanged: true })
  const child = serve(port, env)
  child.on('exit', (code) => process.exit(code ?? 0))
  await waitUntilWell(port, child).catch((trouble) => {
    child.kill()
    throw trouble
  })
  console.log('\nSign in as one of the demo:')
  await runScript('scripts/demo-sign-ins.ts', env)
  console.log(`\nSetdown is at ${env.PUBLIC_ADDRESS}\nStop it with Ctrl-C.`)
})
