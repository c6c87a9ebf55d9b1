import { Readable } from "node:stream";
import {
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  NoSuchKey,
  NotFound as NoSuchObject,
  PutObjectCommand,
  S3Client,
} from "@aws-sdk/client-s3";
import { env } from "#app/env.server.ts";
import { NotFound, Unavailable } from "#app/errors.ts";

let client: S3Client | undefined;

function store(): S3Client {
  const { S3_ENDPOINT, S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY } = env();
  client ??= new S3Client({
    endpoint: S3_ENDPOINT,
    region: S3_REGION,
    credentials: { accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY },
    forcePathStyle: true,
    // Otherwise the SDK frames streamed bodies in a way that the stand-in stores as part of the file.
    requestChecksumCalculation: "WHEN_REQUIRED",
    responseChecksumValidation: "WHEN_REQUIRED",
    maxAttempts: 2,
  });
  return client;
}

async function answeredByStore<T>(ask: () => Promise<T>): Promise<T> {
  try {
    return await ask();
  } catch (error) {
    if (error instanceof NoSuchKey || error instanceof NoSuchObject) throw new NotFound("There is no such file.");
    throw new Unavailable("The store for files is not answering.", { cause: error });
  }
}

/** Keeps bytes under a key. Keys are digests, so writing the same again changes nothing. */
export async function putObject(key: string, body: Uint8Array, contentType: string): Promise<void> {
  await answeredByStore(() =>
    store().send(
      new PutObjectCommand({
        Bucket: env().S3_BUCKET,
        Key: key,
        Body: body,
        ContentType: contentType,
        ContentLength: body.byteLength,
      }),
    ),
  );
}

export async function hasObject(key: string): Promise<boolean> {
  try {
    await answeredByStore(() => store().send(new HeadObjectCommand({ Bucket: env().S3_BUCKET, Key: key })));
    return true;
  } catch (error) {
    if (error instanceof NotFound) return false;
    throw error;
  }
}

/** @throws NotFound, Unavailable */
export async function getObject(key: string): Promise<Uint8Array> {
  return answeredByStore(async () => {
    const found = await store().send(new GetObjectCommand({ Bucket: env().S3_BUCKET, Key: key }));
    if (!found.Body) throw new NotFound("There is no such file.");
    return found.Body.transformToByteArray();
  });
}

/** The same as a stream, for large files. @throws NotFound, Unavailable */
export async function getObjectStream(key: string): Promise<Readable> {
  return answeredByStore(async () => {
    const found = await store().send(new GetObjectCommand({ Bucket: env().S3_BUCKET, Key: key }));
    return found.Body instanceof Readable ? found.Body : Readable.from([]);
  });
}

/** @throws Unavailable when the bucket cannot be reached. */
export async function probeBucket(): Promise<void> {
  await answeredByStore(() => store().send(new HeadBucketCommand({ Bucket: env().S3_BUCKET })));
}
