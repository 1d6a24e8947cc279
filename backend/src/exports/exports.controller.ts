import { Controller, Get, Param, StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { XLSX_TYPE } from './bom-workbook.js';
import { BomWorkbookService } from './bom-workbook.service.js';

@ApiTags('trains')
@Controller('trains')
export class ExportsController {
  constructor(private readonly workbooks: BomWorkbookService) {}

  @Get(':code/bom.xlsx')
  @Allow('bom.export')
  @ApiOkResponse({
    description: 'The bill of materials as a workbook',
    content: { [XLSX_TYPE]: { schema: { type: 'string', format: 'binary' } } },
  })
  async bom(@Param('code') code: string): Promise<StreamableFile> {
    const { name, bytes } = await this.workbooks.ofTrain(code);
    const disposition = `attachment; filename="${name}"`;
    return new StreamableFile(bytes, { type: XLSX_TYPE, disposition, length: bytes.length });
  }
}
