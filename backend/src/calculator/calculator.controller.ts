import { Body, Controller, Header, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { RateLimitBucket } from '../common/decorators';
import { UsesUnions } from '../common/fields/union';
import { DEVICE } from '../devices/dto/device-input.dto';
import { DatasheetValueDto } from '../devices/dto/datasheet-value.dto';
import { CalculatorService } from './calculator.service';
import { CalculationRequestDto, CalculationResultDto, CandidatesRequestDto } from './dto/calculation.dto';
import { CandidatesReportDto } from './dto/candidates.dto';
import { SOURCE } from './dto/specification.dto';
import { STAGE } from './dto/stage.dto';

/** The calculator's threads write their answers out themselves. */
const JSON_TEXT = 'application/json; charset=utf-8';

@ApiTags('calculations')
@UsesUnions([STAGE, DEVICE, SOURCE], [DatasheetValueDto])
@RateLimitBucket('calculation')
@Controller('calculations')
export class CalculatorController {
  constructor(private readonly calculator: CalculatorService) {}

  @Post()
  @HttpCode(200)
  @Header('Content-Type', JSON_TEXT)
  @ApiOkResponse({ type: CalculationResultDto })
  calculate(@Body() request: CalculationRequestDto): Promise<string> {
    return this.calculator.calculate(request);
  }

  @Post('candidates')
  @HttpCode(200)
  @Header('Content-Type', JSON_TEXT)
  @ApiOkResponse({ type: CandidatesReportDto })
  tryDevices(@Body() request: CandidatesRequestDto): Promise<string> {
    return this.calculator.tryDevices(request);
  }
}
