import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { InvalidError } from '../common/errors';
import { DeviceLibraryService } from '../devices/device-library.service';
import { CalculatorThreads } from './calculator-threads';
import { chainInputOf, libraryDeviceIds } from './chain-input';
import type { CalculationRequestDto, CandidatesRequestDto, ChainInputDto } from './dto/calculation.dto';
import type { ChainInput, Device, DeviceKind, Stage } from './engine';

/** The calculator for requests: stateless; only devices are looked up. */
@Injectable()
export class CalculatorService {
  constructor(
    private readonly library: DeviceLibraryService,
    private readonly threads: CalculatorThreads,
    private readonly clock: Clock,
  ) {}

  /** JSON text of a CalculationResult. */
  async calculate(request: CalculationRequestDto): Promise<string> {
    const input = await this.inputOf(request);
    return this.threads.calculate({ input, ...request.include });
  }

  /** JSON text of a CandidatesReport. */
  async tryDevices(request: CandidatesRequestDto): Promise<string> {
    const stage = request.stages.find(({ id }) => id === request.stageId);
    const kind = stage ? deviceKindOf(stage) : null;
    if (kind === null) {
      throw new InvalidError([{ path: 'stageId', code: 'stage_unknown', message: 'names no stage with a device' }]);
    }
    const input = await this.inputOf(request);
    const candidates = await this.candidatesFor(request, kind, input);
    return this.threads.tryDevices({ input, stageId: request.stageId, candidates });
  }

  private async inputOf(request: ChainInputDto): Promise<ChainInput> {
    const devices = await this.library.findForCalculation(libraryDeviceIds(request));
    return { ...chainInputOf(request, devices), today: this.clock.now().toISOString().slice(0, 10) };
  }

  private async candidatesFor(
    { deviceIds, devices = [] }: CandidatesRequestDto,
    kind: DeviceKind,
    { devices: known }: ChainInput,
  ): Promise<Device[]> {
    const library = deviceIds
      ? await this.library.findForCalculation(deviceIds)
      : await this.library.findKindForCalculation(kind);
    const inline = deviceIds ? known.filter((device) => deviceIds.includes(device.id)) : devices;
    const byId = new Map([...library, ...inline].map((device) => [device.id, device]));
    return [...byId.values()].filter((device) => device.kind === kind);
  }
}

/** The kind of device that a stage takes; null: none. */
function deviceKindOf(stage: Stage): DeviceKind | null {
  return stage.kind === 'rc-section' ? null : stage.kind;
}
