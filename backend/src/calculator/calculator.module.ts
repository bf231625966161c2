import { Module } from '@nestjs/common';
import { DevicesModule } from '../devices/devices.module';
import { CalculatorController } from './calculator.controller';
import { CalculatorService } from './calculator.service';
import { CalculatorThreads } from './calculator-threads';

@Module({
  imports: [DevicesModule],
  controllers: [CalculatorController],
  providers: [CalculatorService, CalculatorThreads],
})
export class CalculatorModule {}
