import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { NGINX } from './debian.mjs'
import { waitForPort } from './ports.mjs'
import { Refusal } from './say.mjs'

/**
 * Starts nginx on 127.0.0.1 before several web servers.
 * @param {import('./processes.mjs').Fleet} fleet
 * @param {{folder: string, port: number, behind: number[]}} options the ports it hands requests to
 * @returns {Promise<string>} its access log: a line a request, `<status> <port>[, <port>] <path>`
 */
export async function startProxy(fleet, { folder, port, behind }) {
  rmSync(folder, { recursive: true, force: true })
  mkdirSync(folder, { recursive: true })
  const config = join(folder, 'nginx.conf')
  const log = join(folder, 'access.log')
  writeFileSync(config, configOf({ folder, log, port, behind }))
  await fleet.start({
    name: 'proxy',
    command: NGINX,
    args: ['-p', folder, '-e', join(folder, 'error.log'), '-c', config, '-g', 'daemon off;'],
    cwd: folder,
    env: { PATH: process.env.PATH },
    stopSignal: 'SIGQUIT',
  })
  if (!(await waitForPort(port, { alive: () => fleet.isRunning('proxy') }))) {
    throw new Refusal(`nginx did not start.\n${fleet.tail('proxy')}`)
  }
  return log
}

/*
 * Requests go round the instances in turn. One that cannot be reached, or that goes away before it
 * has begun to answer, is passed over for two seconds and the request given to the next: a write
 * too (non_idempotent), since a create carries its key and an edit its version, so that what is said
 * twice is done once.
 */
function configOf({ folder, log, port, behind }) {
  return `
${process.getuid() === 0 ? 'user root;' : ''}
worker_processes 1;
pid ${folder}/nginx.pid;
error_log ${folder}/error.log warn;
events { worker_connections 512; }
http {
  log_format told '$status $upstream_addr $request_method $uri';
  access_log ${log} told;
  client_body_temp_path ${folder}/body;
  proxy_temp_path ${folder}/proxy;
  fastcgi_temp_path ${folder}/fastcgi;
  uwsgi_temp_path ${folder}/uwsgi;
  scgi_temp_path ${folder}/scgi;
  upstream web {
${behind.map((each) => `    server 127.0.0.1:${each} max_fails=1 fail_timeout=2s;`).join('\n')}
  }
  server {
    listen 127.0.0.1:${port};
    server_name localhost;
    client_max_body_size 4m;
    location / {
      proxy_pass http://web;
      proxy_http_version 1.1;
      proxy_set_header Connection "";
      proxy_set_header Host $http_host;
      proxy_set_header X-Forwarded-Host $http_host;
      proxy_set_header X-Forwarded-Proto $scheme;
      # What the browser says of itself is not believed.
      proxy_set_header X-Forwarded-For $remote_addr;
      proxy_connect_timeout 2s;
      proxy_read_timeout 30s;
      proxy_next_upstream error timeout non_idempotent;
      proxy_next_upstream_tries ${behind.length};
    }
  }
}
`
}
