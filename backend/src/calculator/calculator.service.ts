import { Injectable } from '@nestjs/common';
import { InvalidError } from '../common/errors';
import { DeviceLibraryService } from '../devices/device-library.service';
import { CandidatesPool } from './candidates-pool';
import { chainInputOf, libraryDeviceIds } from './chain-input';
import type { CalculationRequestDto, CalculationResultDto, CandidatesRequestDto } from './dto/calculation.dto';
import type { CandidatesReportDto } from './dto/candidates.dto';
import { EngineInputError, calculate, curves, working } from './engine';
import type { ChainInput, Device, DeviceKind, Stage } from './engine';

/** The calculator for requests: stateless; only devices are looked up. */
@Injectable()
export class CalculatorService {
  constructor(
    private readonly library: DeviceLibraryService,
    private readonly pool: CandidatesPool,
  ) {}

  async calculate(request: CalculationRequestDto): Promise<CalculationResultDto> {
    const input = chainInputOf(request, await this.library.findForCalculation(libraryDeviceIds(request)));
    const { curves: curveRequest, working: workingRequest } = request.include ?? {};
    return refusals(() => ({
      report: calculate(input),
      curves: curveRequest ? curves(input, curveRequest) : null,
      working: workingRequest ? working(input, workingRequest) : null,
    }));
  }

  async tryDevices(request: CandidatesRequestDto): Promise<CandidatesReportDto> {
    const stage = request.stages.find(({ id }) => id === request.stageId);
    const kind = stage ? deviceKindOf(stage) : null;
    if (kind === null) {
      throw new InvalidError([{ path: 'stageId', code: 'stage_unknown', message: 'names no stage with a device' }]);
    }
    const used = await this.library.findForCalculation(libraryDeviceIds(request));
    const input = chainInputOf(request, used);
    const candidates = await this.candidatesFor(request, kind, input);
    return this.pool.tryDevices({ input, stageId: request.stageId, candidates });
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

/** Runs the calculator; what it refuses becomes 422 with the fields it names. */
function refusals<T>(run: () => T): T {
  try {
    return run();
  } catch (error) {
    throw error instanceof EngineInputError ? new InvalidError(error.issues) : error;
  }
}
