import { Body, Controller, HttpCode, Post } from '@nestjs/common';
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

@ApiTags('calculations')
@UsesUnions([STAGE, DEVICE, SOURCE], [DatasheetValueDto])
@RateLimitBucket('calculation')
@Controller('calculations')
export class CalculatorController {
  constructor(private readonly calculator: CalculatorService) {}

  @Post()
  @HttpCode(200)
  @ApiOkResponse({ type: CalculationResultDto })
  calculate(@Body() request: CalculationRequestDto): Promise<CalculationResultDto> {
    return this.calculator.calculate(request);
  }

  @Post('candidates')
  @HttpCode(200)
  @ApiOkResponse({ type: CandidatesReportDto })
  tryDevices(@Body() request: CandidatesRequestDto): Promise<CandidatesReportDto> {
    return this.calculator.tryDevices(request);
  }
}
