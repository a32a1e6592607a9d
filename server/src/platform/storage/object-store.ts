import type { Readable } from 'node:stream';
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  CreateBucketCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { Upload } from '@aws-sdk/lib-storage';
import { Inject, Injectable, type OnModuleDestroy, type OnModuleInit } from '@nestjs/common';
import { type Configuration, CONFIGURATION } from '../config/configuration.js';

/** Files in any S3-compatible storage, under names that the server makes up. */
@Injectable()
export class ObjectStore implements OnModuleInit, OnModuleDestroy {
  private readonly client: S3Client;
  private readonly bucket: string;

  constructor(@Inject(CONFIGURATION) configuration: Configuration) {
    this.bucket = configuration.S3_BUCKET;
    this.client = new S3Client({
      endpoint: configuration.S3_ENDPOINT,
      region: configuration.S3_REGION,
      credentials: { accessKeyId: configuration.S3_ACCESS_KEY, secretAccessKey: configuration.S3_SECRET_KEY },
      forcePathStyle: true,
      // Trailing checksums corrupt streams on storages that do not know them, without an error.
      requestChecksumCalculation: 'WHEN_REQUIRED',
      responseChecksumValidation: 'WHEN_REQUIRED',
    });
  }

  async onModuleInit(): Promise<void> {
    await this.client
      .send(new HeadBucketCommand({ Bucket: this.bucket }))
      .catch(() => this.client.send(new CreateBucketCommand({ Bucket: this.bucket })));
  }

  onModuleDestroy(): void {
    this.client.destroy();
  }

  async put(key: string, content: Readable, mediaType: string): Promise<void> {
    const upload = new Upload({
      client: this.client,
      params: { Bucket: this.bucket, Key: key, Body: content, ContentType: mediaType },
    });
    await upload.done();
  }

  /** @param range first and last byte, both included */
  async get(key: string, range?: { first: number; last: number }): Promise<Readable> {
    const answer = await this.client.send(
      new GetObjectCommand({
        Bucket: this.bucket,
        Key: key,
        ...(range ? { Range: `bytes=${String(range.first)}-${String(range.last)}` } : {}),
      }),
    );
    return answer.Body as Readable;
  }

  async remove(key: string): Promise<void> {
    await this.client.send(new DeleteObjectCommand({ Bucket: this.bucket, Key: key }));
  }

  /** @throws when the storage cannot be reached */
  async check(): Promise<void> {
    await this.client.send(new HeadBucketCommand({ Bucket: this.bucket }));
  }
}
