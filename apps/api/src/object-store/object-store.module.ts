import { Module } from '@nestjs/common';
import { ObjectStore } from './object-store.service';

@Module({ providers: [ObjectStore], exports: [ObjectStore] })
export class ObjectStoreModule {}
