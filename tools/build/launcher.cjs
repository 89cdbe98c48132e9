#!/usr/bin/env node
// Starts the command line from its bundle, with the code that V8 compiled when it was built.
const { readFileSync } = require('node:fs')
const { Script } = require('node:vm')

const filename = `${__dirname}/skerry-main.cjs`
const cacheFile = `${__dirname}/skerry-main.cache`
const make = process.env.SKERRY_MAKE_CACHE === '1'

function compiled() {
  if (make) return undefined
  try {
    return readFileSync(cacheFile)
  } catch (error) {
    if (error.code === 'ENOENT') return undefined
    throw error
  }
}

const script = new Script(readFileSync(filename, 'latin1'), { filename, cachedData: compiled() })
const own = { exports: {} }
script.runInThisContext()(own.exports, require, own, filename, __dirname)
if (make) process.on('exit', () => require('node:fs').writeFileSync(cacheFile, script.createCachedData()))
