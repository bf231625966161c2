import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Runtime } from '../config/runtime';
import { databaseFile } from './data-folder';
import { SessionStore } from './session-store';
import { sqliteOptions } from './sqlite';
import { WriteQueue } from './write-queue';

const sessionStoreProvider = {
  provide: SessionStore,
  inject: [Runtime],
  useFactory: async (runtime: Runtime): Promise<SessionStore> => {
    const sessionStore = new SessionStore(runtime);
    await sessionStore.prepare();
    return sessionStore;
  },
};

@Global()
@Module({
  imports: [
    SequelizeModule.forRootAsync({
      inject: [Runtime],
      useFactory: (runtime: Runtime) => ({
        ...sqliteOptions(databaseFile(runtime.config.dataDir)),
        autoLoadModels: true,
        // With autoLoadModels alone the library would run sync() beside the migrations.
        synchronize: false,
        retryAttempts: 0,
      }),
    }),
  ],
  providers: [WriteQueue, sessionStoreProvider],
  exports: [WriteQueue, SessionStore],
})
export class DatabaseModule {}
