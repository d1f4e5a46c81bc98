import { Body, Controller, HttpCode, Post, Req, Res } from '@nestjs/common';
import { ApiAcceptedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type ConfirmEmail,
  confirmEmailSchema,
  type ForgotPassword,
  forgotPasswordSchema,
  mailSentSchema,
  type ResetPassword,
  resetPasswordSchema,
  type SignedIn,
  signedInSchema,
  type SignIn,
  signInSchema,
  type SignUp,
  signUpSchema,
} from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Public } from '../../common/access/access.decorator.js';
import { AuthService } from './auth.service.js';
import { LinksService } from './links.service.js';

@ApiTags('sign-in')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly links: LinksService,
  ) {}

  @Post('sign-up')
  @HttpCode(202)
  @Public()
  @ApiAcceptedResponse({ standardSchema: mailSentSchema })
  signUp(@Body({ schema: signUpSchema }) input: SignUp, @Req() request: FastifyRequest) {
    return this.links.signUp(input, request.ip);
  }

  @Post('confirm-email')
  @HttpCode(204)
  @Public()
  confirmEmail(
    @Body({ schema: confirmEmailSchema }) { token }: ConfirmEmail,
    @Req() request: FastifyRequest,
  ): Promise<void> {
    return this.links.confirmEmail(token, request.ip);
  }

  @Post('sign-in')
  @HttpCode(200)
  @Public()
  @ApiOkResponse({ standardSchema: signedInSchema })
  signIn(
    @Body({ schema: signInSchema }) input: SignIn,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SignedIn> {
    return this.auth.signIn(input, request, reply);
  }

  @Post('refresh')
  @HttpCode(200)
  @Public()
  @ApiOkResponse({ standardSchema: signedInSchema })
  refresh(
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<SignedIn> {
    return this.auth.refresh(request, reply);
  }

  @Post('sign-out')
  @HttpCode(204)
  @Public()
  signOut(@Req() request: FastifyRequest, @Res({ passthrough: true }) reply: FastifyReply): Promise<void> {
    return this.auth.signOut(request, reply);
  }

  @Post('forgot-password')
  @HttpCode(202)
  @Public()
  @ApiAcceptedResponse({ standardSchema: mailSentSchema })
  forgotPassword(
    @Body({ schema: forgotPasswordSchema }) input: ForgotPassword,
    @Req() request: FastifyRequest,
  ) {
    return this.links.forgotPassword(input, request.ip);
  }

  @Post('reset-password')
  @HttpCode(204)
  @Public()
  resetPassword(
    @Body({ schema: resetPasswordSchema }) input: ResetPassword,
    @Req() request: FastifyRequest,
  ): Promise<void> {
    return this.links.resetPassword(input, request.ip);
  }
}
