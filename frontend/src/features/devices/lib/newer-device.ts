import { isApiError } from '../../../api/api-error';
import type { DeviceDto } from '../../../api/types';

/** The device as somebody else saved it, when a save was refused because it came too late. */
export function newerDevice(error: unknown): DeviceDto | null {
  return isApiError(error) && error.isStale ? ((error.details.current as DeviceDto | undefined) ?? null) : null;
}
