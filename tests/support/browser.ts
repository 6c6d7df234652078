import { mkdtemp } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import {
  chromium,
  type Browser,
  type BrowserContext,
  type BrowserContextOptions,
  type ConsoleMessage,
  type Page,
} from 'playwright-core'
import { afterAll, afterEach, beforeAll, expect, inject } from 'vitest'

const PROGRAM = '/usr/bin/chromium'

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

/** How long a screen may take to show what is waited for, on a busy machine. */
const PATIENCE = 30_000

/** What people of each place hold in their hands. */
const DEVICES = {
  phone: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true },
  tablet: { viewport: { width: 1280, height: 800 }, hasTouch: true },
  desktop: { viewport: { width: 1440, height: 900 } },
} as const satisfies Record<string, BrowserContextOptions>

export type DeviceKind = keyof typeof DEVICES

/** One browser of one person. */
export interface Device {
  readonly page: Page
  readonly context: BrowserContext
  /** Answers with this status belong to the test: the browser's note of them is no fault. */
  readonly expectStatus: (status: number) => void
  /** From now on requests may fail for want of a connection. */
  readonly expectLostConnection: () => void
}

export interface DeviceOptions {
  readonly colorScheme?: 'light' | 'dark'
  /** Named in a screenshot's file. */
  readonly name?: string
}

interface Opened {
  readonly name: string
  readonly device: Device
  readonly faults: string[]
}

const FAILED_STATUS = /^Failed to load resource: the server responded with a status of (\d{3}) /
const LOST_CONNECTION = /^Failed to load resource: net::ERR_/

/**
 * Chromium for the tests of a file. After each test its devices are closed; an error in a page or
 * on its console fails the test, and each failed test leaves a screenshot of every page in the
 * temporary folder.
 */
export function useBrowser(): {
  open: (kind: DeviceKind, options?: DeviceOptions) => Promise<Device>
} {
  let browser: Browser
  let opened: Opened[] = []

  beforeAll(async () => {
    browser = await chromium.launch({ executablePath: PROGRAM, args: FLAGS })
  })
  afterAll(() => browser.close())

  afterEach(async ({ task }) => {
    const all = opened
    opened = []
    const faults = all.flatMap(({ name, faults }) => faults.map((fault) => `${name}: ${fault}`))
    if (task.result?.state === 'fail' || faults.length > 0) await takePictures(all)
    await Promise.all(all.map(({ device }) => device.context.close()))
    expect(faults, 'errors in the browser').toEqual([])
  })

  const open = async (kind: DeviceKind, options: DeviceOptions = {}): Promise<Device> => {
    const { name = kind, colorScheme = 'light' } = options
    const context = await browser.newContext({
      ...DEVICES[kind],
      baseURL: inject('productUrl'),
      locale: 'en-US',
      timezoneId: 'America/Chicago',
      colorScheme,
      reducedMotion: 'reduce',
    })
    context.setDefaultTimeout(PATIENCE)
    const page = await context.newPage()
    const faults: string[] = []
    const statuses = new Set<string>()
    let connected = true
    const isExpected = (message: ConsoleMessage): boolean => {
      const status = FAILED_STATUS.exec(message.text())?.[1]
      if (status !== undefined) return statuses.has(status)
      return !connected && LOST_CONNECTION.test(message.text())
    }
    page.on('pageerror', (error) => faults.push(error.stack ?? error.message))
    page.on('console', (message) => {
      if (message.type() !== 'error' || isExpected(message)) return
      faults.push(`${message.text()} (${message.location().url})`)
    })
    const device: Device = {
      page,
      context,
      expectStatus: (status) => void statuses.add(String(status)),
      expectLostConnection: () => {
        connected = false
      },
    }
    opened.push({ name, device, faults })
    return device
  }
  return { open }
}

async function takePictures(all: readonly Opened[]): Promise<void> {
  const folder = await mkdtemp(join(tmpdir(), 'foldyard-screens-'))
  for (const { name, device } of all) {
    const path = join(folder, `${name}.png`)
    await device.page.screenshot({ path })
    process.stderr.write(`Screenshot: ${path}\n`)
  }
}
