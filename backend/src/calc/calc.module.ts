import { Module } from '@nestjs/common';
import { WorkersModule } from '../workers/workers.module.js';
import { CalcController } from './calc.controller.js';
import { CalcService } from './calc.service.js';

@Module({ imports: [WorkersModule], controllers: [CalcController], providers: [CalcService] })
export class CalcModule {}
