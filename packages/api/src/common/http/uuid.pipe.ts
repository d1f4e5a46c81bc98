import { Injectable, type PipeTransform } from '@nestjs/common';
import { NotFound } from '../errors/app-error.js';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** Ids are opaque: one of another form names nothing. */
@Injectable()
export class UuidPipe implements PipeTransform<string, string> {
  transform(value: string): string {
    if (!UUID.test(value)) throw new NotFound('thing');
    return value.toLowerCase();
  }
}
