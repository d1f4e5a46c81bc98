import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type AskFitCheck,
  askFitCheckSchema,
  type FitCheck,
  fitCheck,
  fitCheckSchema,
} from '@rivetside/shared';
import { Public } from '../../common/access/access.decorator.js';

/** The same function that runs in the page; nothing is stored. */
@ApiTags('fit check')
@Controller('fit-checks')
export class FitChecksController {
  @Post()
  @Public()
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: fitCheckSchema })
  check(@Body({ schema: askFitCheckSchema }) { holeCard }: AskFitCheck): FitCheck {
    return fitCheck(holeCard);
  }
}
