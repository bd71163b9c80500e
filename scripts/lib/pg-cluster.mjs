import fs from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { Failure } from './failure.mjs'
import { withLock } from './lock.mjs'
import { inData, root } from './paths.mjs'
import { checkCluster, createCluster } from './pg-create.mjs'
import { DATABASE, infoFileOf, readInfo, urlOf, writeInfo } from './pg-info.mjs'
import { awaitAnswer, halt, launch } from './pg-launch.mjs'
import { farFolder } from './pg-place.mjs'
import { postmasterOf, serverProcesses } from './pg-processes.mjs'
import { runSql } from './pg-programs-for.mjs'

/** @typedef {ReturnType<typeof cluster>} Cluster */

/**
 * A private PostgreSQL cluster of this checkout: loopback only, no unix socket, password by scram, a free port.
 * @param {import('./pg-info.mjs').ClusterName} name
 * @param {(line: string) => void} [say] told what a person should know, such as a folder elsewhere
 */
export function cluster(name, say = () => {}) {
  const locked = (/** @type {() => any} */ work) => withLock(inData(`${name}.lock`), work)

  const start = async () => {
    const known = readInfo(name)
    if (known?.ready) checkCluster(known)
    const info = known?.ready ? known : createCluster(name, say)
    const running = postmasterOf(info.folder)
    if (running) {
      info.port = running.port || info.port
      await awaitAnswer(info)
      writeInfo(name, info)
    } else {
      await launch(name, info)
    }
    if (!info.ready) {
      runSql(info, `create database ${DATABASE}`, 'postgres')
      info.ready = true
      writeInfo(name, info)
    }
    return { url: urlOf(info), wasRunning: running !== null }
  }

  const pid = () => {
    const info = readInfo(name)
    return info && fs.existsSync(info.folder) ? (postmasterOf(info.folder)?.pid ?? 0) : 0
  }

  const stop = () => {
    const info = readInfo(name)
    if (info && pid()) halt(info)
  }

  const destroy = async () => {
    for (const folder of new Set([rememberedFolder(name), inData(name), path.join(farFolder(root), name)])) {
      if (fs.existsSync(folder)) {
        for (const each of serverProcesses(folder)) process.kill(each, 'SIGKILL')
        while (serverProcesses(folder).length > 0) await sleep(20)
      }
      for (const place of [folder, `${folder}.log`, `${folder}.log.old`]) fs.rmSync(place, { recursive: true, force: true })
    }
    fs.rmSync(infoFileOf(name), { force: true })
    const far = farFolder(root)
    if (fs.existsSync(far) && fs.readdirSync(far).length === 0) fs.rmdirSync(far)
  }

  return {
    name,
    /** @returns {Promise<{ url: string, wasRunning: boolean }>} */
    start: () => locked(start),
    /** @returns {Promise<void>} */
    stop: () => locked(stop),
    /** Removes the cluster with all its records. @returns {Promise<void>} */
    destroy: () => locked(destroy),
    /** The number of the living postmaster, 0 when stopped. */
    pid,
    info: () => readInfo(name),
    /** @param {{ seeded: boolean }} more */
    remember: (more) => {
      const info = readInfo(name)
      if (info) writeInfo(name, { ...info, ...more })
    },
    /** @param {string} [database] */
    url: (database) => {
      const info = readInfo(name)
      if (!info?.ready) throw new Failure('There is no database yet: npm start makes it.')
      return urlOf(info, database)
    },
    /**
     * @param {string} sql
     * @param {string} [database]
     */
    query: (sql, database) => {
      const info = readInfo(name)
      if (!info?.ready) throw new Failure('There is no database yet: npm start makes it.')
      return runSql(info, sql, database)
    },
  }
}

/** A remembering file that cannot be read must not stand against removing what it remembers. @param {import('./pg-info.mjs').ClusterName} name */
function rememberedFolder(name) {
  try {
    return readInfo(name)?.folder ?? inData(name)
  } catch {
    return inData(name)
  }
}
