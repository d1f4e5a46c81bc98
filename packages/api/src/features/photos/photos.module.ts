import { Module } from '@nestjs/common';
import { Settings } from '../../common/config/settings.js';
import { BucketPhotoStore, FilePhotoStore, PhotoStore } from './photo-store.js';
import { PhotoUrlsService } from './photo-urls.service.js';
import { PhotosController } from './photos.controller.js';
import { PhotosService } from './photos.service.js';

@Module({
  controllers: [PhotosController],
  providers: [
    PhotosService,
    PhotoUrlsService,
    {
      provide: PhotoStore,
      inject: [Settings],
      useFactory: (settings: Settings) =>
        settings.env.S3_BUCKET ? new BucketPhotoStore(settings) : new FilePhotoStore(settings),
    },
  ],
  exports: [PhotosService, PhotoUrlsService, PhotoStore],
})
export class PhotosModule {}
