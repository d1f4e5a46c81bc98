import { Injectable } from '@nestjs/common';
import { Logger } from 'nestjs-pino';

/** Nest tells of each module and route at every start; whoever wants that asks for debug. */
const START_UP = new Set(['InstanceLoader', 'RouterExplorer', 'RoutesResolver', 'WebSocketsController']);

@Injectable()
export class AppLogger extends Logger {
  override log(message: unknown, ...params: unknown[]): void {
    if (START_UP.has(String(params.at(-1)))) this.debug(message, ...params);
    else super.log(message, ...params);
  }
}
