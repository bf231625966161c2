import { Module } from '@nestjs/common';
import { DevicesModule } from '../devices/devices.module';
import { CalculatorController } from './calculator.controller';
import { CalculatorService } from './calculator.service';
import { CandidatesPool } from './candidates-pool';

@Module({
  imports: [DevicesModule],
  controllers: [CalculatorController],
  providers: [CalculatorService, CandidatesPool],
})
export class CalculatorModule {}
