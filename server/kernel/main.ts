import { text } from 'node:stream/consumers'
import { answerKernel } from './answer'

// The command line of the kernel: `kernel <verb> < input.json`, JSON on stdout, and the exit code.
const { exit, output } = answerKernel(process.argv[2], await text(process.stdin))
process.stdout.write(`${JSON.stringify(output, null, 2)}\n`)
process.exitCode = exit
