import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query, Req, Res } from '@nestjs/common';
import {
  ApiBody,
  ApiConsumes,
  ApiCreatedResponse,
  ApiOkResponse,
  ApiProduces,
  ApiTags,
} from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type DescribePhoto,
  describePhotoSchema,
  type Photo,
  PHOTO_SIZES,
  photoSchema,
  type PhotoSize,
} from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { z } from 'zod';
import { Access, Actor, Public } from '../../common/access/access.decorator.js';
import { NotFound } from '../../common/errors/app-error.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { PhotoUrlsService } from './photo-urls.service.js';
import { PhotosService } from './photos.service.js';
import { readUpload } from './read-upload.js';

const signedSchema = z.strictObject({ until: z.string().max(20), signature: z.string().max(64) });

@ApiTags('photos')
@Controller('photos')
export class PhotosController {
  constructor(
    private readonly photos: PhotosService,
    private readonly urls: PhotoUrlsService,
  ) {}

  @Post()
  @Access('authenticated')
  @ApiConsumes('multipart/form-data')
  @ApiBody({
    schema: {
      type: 'object',
      properties: { file: { type: 'string', format: 'binary' } },
      required: ['file'],
    },
  })
  @ApiCreatedResponse({ standardSchema: photoSchema })
  async keep(@Actor() actor: ActorType, @Req() request: FastifyRequest): Promise<Photo> {
    return this.photos.keep(actor, await readUpload(request));
  }

  @Patch(':id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: photoSchema })
  describe(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: describePhotoSchema }) input: DescribePhoto,
  ): Promise<Photo> {
    return this.photos.describe(actor, id, input);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('authenticated')
  discard(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Promise<void> {
    return this.photos.discard(actor, id);
  }

  /** The signature is the permission; it was given to somebody who may see what the photo hangs on. */
  @Get(':id/:size')
  @Public()
  @ApiProduces('image/jpeg')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async show(
    @Param('id', UuidPipe) id: string,
    @Param('size') size: string,
    @Query({ schema: signedSchema }) { until, signature }: z.infer<typeof signedSchema>,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    const known = (PHOTO_SIZES as readonly string[]).includes(size);
    const bytes =
      known && this.urls.isGood(id, size, until, signature)
        ? await this.photos.read(id, size as PhotoSize)
        : null;
    if (!bytes) throw new NotFound('photo');
    await reply
      .header('cache-control', 'private, max-age=3000')
      .header('content-security-policy', "default-src 'none'; sandbox")
      .header('content-disposition', 'inline')
      .type('image/jpeg')
      .send(bytes);
  }
}
