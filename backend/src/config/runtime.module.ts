import { type DynamicModule, Global, Module } from '@nestjs/common';
import { Runtime } from './runtime';

@Global()
@Module({})
export class RuntimeModule {
  static register(runtime: Runtime): DynamicModule {
    return {
      module: RuntimeModule,
      providers: [{ provide: Runtime, useValue: runtime }],
      exports: [Runtime],
    };
  }
}
