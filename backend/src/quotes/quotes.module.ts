import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { DevicesModule } from '../devices/devices.module';
import { QuoteBreak } from './models/quote-break.model';
import { Quote } from './models/quote.model';
import { QuotesController } from './quotes.controller';
import { QuotesService } from './quotes.service';

@Module({
  imports: [SequelizeModule.forFeature([Quote, QuoteBreak]), DevicesModule],
  controllers: [QuotesController],
  providers: [QuotesService],
})
export class QuotesModule {}
