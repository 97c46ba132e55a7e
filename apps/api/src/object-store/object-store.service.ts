import {
  DeleteObjectCommand,
  GetObjectCommand,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
  type S3ClientConfig,
} from '@aws-sdk/client-s3';
import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Problem } from '../common/problem';
import { InjectSettings, type ObjectStoreSettings, type Settings } from '../config/settings';

const CONNECT_MS = 3_000;
const ANSWER_MS = 20_000;

/** Bytes under keys in a bucket that nobody else reads; addresses of the store are never given out. */
@Injectable()
export class ObjectStore implements OnModuleDestroy {
  private readonly logger = new Logger(ObjectStore.name);
  private readonly client: S3Client | null;
  private readonly bucket: string;

  constructor(@InjectSettings() { objectStore }: Settings) {
    this.client = objectStore && new S3Client(clientSettings(objectStore));
    this.bucket = objectStore?.bucket ?? '';
  }

  onModuleDestroy(): void {
    this.client?.destroy();
  }

  get isSetUp(): boolean {
    return this.client !== null;
  }

  async put(key: string, body: Buffer, type: string): Promise<void> {
    await this.asking((client) =>
      client.send(
        new PutObjectCommand({
          Bucket: this.bucket,
          Key: key,
          Body: body,
          ContentType: type,
          ContentLength: body.length,
        }),
      ),
    );
  }

  async get(key: string): Promise<Buffer> {
    const answer = await this.asking((client) =>
      client.send(new GetObjectCommand({ Bucket: this.bucket, Key: key })),
    );
    if (!answer.Body) throw unavailable();
    return Buffer.from(await answer.Body.transformToByteArray());
  }

  /** Also of a key that holds nothing. */
  async remove(key: string): Promise<void> {
    await this.asking((client) => client.send(new DeleteObjectCommand({ Bucket: this.bucket, Key: key })));
  }

  private async asking<T>(ask: (client: S3Client) => Promise<T>): Promise<T> {
    if (this.client === null) throw unavailable();
    try {
      return await ask(this.client);
    } catch (fault) {
      if (fault instanceof NoSuchKey) throw Problem.notFound('file');
      this.logger.error(fault instanceof Error ? `${fault.name}: ${fault.message}` : String(fault));
      throw unavailable();
    }
  }
}

function clientSettings(settings: ObjectStoreSettings): S3ClientConfig {
  const { region, endpoint, accessKeyId, secretAccessKey } = settings;
  return {
    region,
    ...(endpoint !== null && { endpoint, forcePathStyle: true }),
    credentials: { accessKeyId, secretAccessKey },
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 2,
    requestHandler: { connectionTimeout: CONNECT_MS, requestTimeout: ANSWER_MS },
  };
}

function unavailable(): Problem {
  return new Problem(503, 'files-unavailable', 'The store for files does not answer. Try again later.');
}
