import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { type DemoSignIn, demoSignInSchema } from '@rivetside/shared';
import { z } from 'zod';
import { Public } from '../../common/access/access.decorator.js';
import { NotFound } from '../../common/errors/app-error.js';
import { DemoService } from './demo.service.js';

/** Lets the sign-in page offer the people of the demo; elsewhere there is nothing at this address. */
@ApiTags('sign-in')
@Controller('demo')
export class DemoController {
  constructor(private readonly demo: DemoService) {}

  @Get()
  @Public()
  @ApiOkResponse({ standardSchema: z.array(demoSignInSchema) })
  signIns(): DemoSignIn[] {
    const people = this.demo.signIns();
    if (people.length === 0) throw new NotFound('demo');
    return people;
  }
}
