import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiOkResponse,
  ApiServiceUnavailableResponse,
  ApiTags,
} from '@nestjs/swagger';
import { type SearchOutcome } from '@stageyard/libs/train-planner';
import { Allow } from '../auth/allow.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { SearchOutcomeDto } from '../option-searches/dto/search-outcome.dto.js';
import { CalcService } from './calc.service.js';
import { FractionsInputDto } from './dto/fractions-input.dto.js';
import { FractionsDto } from './dto/fractions.dto.js';
import { GearGeometryDto } from './dto/gear-geometry.dto.js';
import { GearInputDto } from './dto/gear-input.dto.js';
import { MeshGeometryDto } from './dto/mesh-geometry.dto.js';
import { MeshInputDto } from './dto/mesh-input.dto.js';
import { OptionRequestDto } from './dto/option-request.dto.js';
import { ShiftInputDto } from './dto/shift-input.dto.js';
import { ShiftResultDto } from './dto/shift-result.dto.js';

/** Calculations that keep nothing: for the screens, and for scripts. */
@ApiTags('calculations')
@ApiBadRequestResponse({ type: Problem, description: 'Names every field at fault, its value and the limit.' })
@Allow('calc.use')
@Controller('calc')
export class CalcController {
  constructor(private readonly calc: CalcService) {}

  /** One gear. */
  @Post('gear')
  @HttpCode(200)
  @ApiOkResponse({ type: GearGeometryDto })
  gear(@Body() input: GearInputDto): GearGeometryDto {
    return this.calc.gear(input);
  }

  /** One pair of gears at a centre distance, an allowance, or without backlash. */
  @Post('mesh')
  @HttpCode(200)
  @ApiOkResponse({ type: MeshGeometryDto })
  mesh(@Body() input: MeshInputDto): MeshGeometryDto {
    return this.calc.mesh(input);
  }

  /** Profile shifts by a policy. */
  @Post('shift')
  @HttpCode(200)
  @ApiOkResponse({ type: ShiftResultDto })
  shift(@Body() input: ShiftInputDto): ShiftResultDto {
    return this.calc.shift(input);
  }

  /** Every train that meets a requirement, the best first, and why a stage count gives none. */
  @Post('options')
  @HttpCode(200)
  @ApiOkResponse({ type: SearchOutcomeDto })
  @ApiServiceUnavailableResponse({ type: Problem, description: 'Other searches kept the threads busy.' })
  options(@Body() input: OptionRequestDto): Promise<SearchOutcome> {
    return this.calc.options(input);
  }

  /** Fractions of small terms near a ratio. */
  @Post('fractions')
  @HttpCode(200)
  @ApiOkResponse({ type: FractionsDto })
  fractions(@Body() input: FractionsInputDto): FractionsDto {
    return this.calc.fractions(input);
  }
}
