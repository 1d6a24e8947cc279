import { Module } from '@nestjs/common';
import { HouseRulesController } from './house-rules.controller.js';

@Module({ controllers: [HouseRulesController] })
export class HouseRulesModule {}
