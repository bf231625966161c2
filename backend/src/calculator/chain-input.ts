import { DEFAULT_POLICY } from './engine';
import type { ChainInput, Device } from './engine';
import type { ChainInputDto } from './dto/calculation.dto';

/** Ids of library devices: everything that stages name and that was not sent along. */
export function libraryDeviceIds({ stages, devices = [] }: ChainInputDto): string[] {
  const inline = new Set(devices.map((device) => device.id));
  const named = stages.flatMap((stage) => ('deviceId' in stage ? [stage.deviceId] : []));
  return [...new Set(named)].filter((id) => !inline.has(id));
}

/** The whole input of the calculator from a request and the devices found in the library. */
export function chainInputOf(request: ChainInputDto, libraryDevices: readonly Device[]): ChainInput {
  const { specification, stages, currency, buildQuantity, policy, devices = [] } = request;
  return {
    specification,
    policy: { ...DEFAULT_POLICY, ...policy },
    stages,
    devices: [...devices, ...libraryDevices],
    currency,
    buildQuantity,
  };
}
