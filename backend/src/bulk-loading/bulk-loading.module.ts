import { Module } from '@nestjs/common';
import { BulkLoader } from './bulk-loader.service.js';

@Module({ providers: [BulkLoader], exports: [BulkLoader] })
export class BulkLoadingModule {}
