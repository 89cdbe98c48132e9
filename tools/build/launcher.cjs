#!/usr/bin/env node
// Starts the command line from its bundle, with the code that V8 compiled when it was built.
const { readFileSync, writeFileSync } = require('node:fs')
const { Script } = require('node:vm')

/** The bundle whose cache is being made, in the build. */
const make = process.env.SKERRY_MAKE_CACHE

function compiled(name) {
  if (make === name) return undefined
  try {
    return readFileSync(`${__dirname}/${name}.cache`)
  } catch (error) {
    if (error.code === 'ENOENT') return undefined
    throw error
  }
}

/** Runs a bundle, which is one function, and gives what it exports. */
function run(name, load) {
  const filename = `${__dirname}/${name}.cjs`
  const script = new Script(readFileSync(filename, 'latin1'), { filename, cachedData: compiled(name) })
  const own = { exports: {} }
  script.runInThisContext()(own.exports, load, own, filename, __dirname)
  if (make === name) process.on('exit', () => writeFileSync(`${__dirname}/${name}.cache`, script.createCachedData()))
  return own.exports
}

/** The typesetting engine is large enough for a cache of its own; it is there when a page is set. */
let paper
function load(name) {
  if (name !== './skerry-paper.cjs') return require(name)
  paper ??= run('skerry-paper', require)
  return paper
}

run('skerry-main', load)
