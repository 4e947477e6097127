import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { createServer } from 'node:net'
import type { Visitor } from './visitor'

/** What drives a WebKit: its driver, the browser that the driver starts, and a screen for it. */
interface WebKit {
  readonly driver: string
  readonly browser: string
  readonly screen: string
}

/** Opens a window of WebKit, and drives it through the W3C's WebDriver protocol. */
export async function openWebKit({ driver, browser, screen }: WebKit): Promise<Visitor> {
  const port = await freePort()
  // A group of its own, so that the screen and the browser end with the driver.
  const child = spawn(screen, ['-a', driver, `--port=${port}`], { detached: true, stdio: 'ignore' })
  const kill = () => {
    if (child.pid !== undefined && child.exitCode === null) process.kill(-child.pid, 'SIGKILL')
  }
  try {
    const address = `http://127.0.0.1:${port}`
    await untilReady(`${address}/status`)
    const { sessionId } = await call<{ sessionId: string }>('POST', `${address}/session`, {
      capabilities: {
        alwaysMatch: {
          browserName: 'MiniBrowser',
          'webkitgtk:browserOptions': { binary: browser, args: ['--automation'] },
        },
      },
    })
    const session = `${address}/session/${sessionId}`
    return {
      open: (url) => call('POST', `${session}/url`, { url }),
      run: (expression) =>
        call('POST', `${session}/execute/async`, {
          script: `const done = arguments[0]; Promise.resolve(${expression}).then(done)`,
          args: [],
        }),
      end: async () => {
        await call('DELETE', session).catch(() => undefined)
        kill()
      },
    }
  } catch (error) {
    kill()
    throw error
  }
}

async function call<Value>(method: string, url: string, body?: object): Promise<Value> {
  const response = await fetch(url, {
    method,
    ...(body && { body: JSON.stringify(body), headers: { 'Content-Type': 'application/json' } }),
  })
  const { value }: { value: Value & { error?: string; message?: string } } = JSON.parse(
    await response.text(),
  )
  if (!response.ok) throw new Error(`WebKit: ${value.error}: ${value.message}`)
  return value
}

async function untilReady(url: string): Promise<void> {
  for (let tries = 0; tries < 150; tries += 1) {
    if (
      await fetch(url).then(
        ({ ok }) => ok,
        () => false,
      )
    )
      return
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error('The driver of WebKit did not start.')
}

async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1')
  await once(server, 'listening')
  const address = server.address()
  server.close()
  if (address === null || typeof address === 'string') throw new Error('There is no free port.')
  return address.port
}
