/**
 * The local object store: s3rver over a folder, for development and tests. It checks neither
 * signatures nor the conditions of a presigned POST; a real store does.
 *
 * Settings: OBJECT_STORE_FOLDER, OBJECT_STORE_PORT, OBJECT_STORE_BUCKETS and OBJECT_STORE_ORIGINS
 * (both lists separated by commas).
 */
import S3rver from 's3rver'

const { OBJECT_STORE_FOLDER, OBJECT_STORE_PORT, OBJECT_STORE_BUCKETS, OBJECT_STORE_ORIGINS } =
  process.env

const cors = `<CORSConfiguration><CORSRule>
  ${OBJECT_STORE_ORIGINS.split(',')
    .map((origin) => `<AllowedOrigin>${origin}</AllowedOrigin>`)
    .join('')}
  <AllowedMethod>GET</AllowedMethod><AllowedMethod>HEAD</AllowedMethod>
  <AllowedMethod>POST</AllowedMethod><AllowedMethod>PUT</AllowedMethod>
  <AllowedHeader>*</AllowedHeader><ExposeHeader>ETag</ExposeHeader>
  <MaxAgeSeconds>3000</MaxAgeSeconds>
</CORSRule></CORSConfiguration>`

const store = new S3rver({
  address: '127.0.0.1',
  port: Number(OBJECT_STORE_PORT),
  directory: OBJECT_STORE_FOLDER,
  silent: true,
  vhostBuckets: false,
  configureBuckets: OBJECT_STORE_BUCKETS.split(',').map((name) => ({ name, configs: [cors] })),
})

await store.run()

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.once(signal, () => {
    store.httpServer.closeAllConnections()
    void store.close().finally(() => process.exit(0))
  })
}
