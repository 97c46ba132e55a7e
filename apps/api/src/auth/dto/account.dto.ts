import { ApiProperty } from '@nestjs/swagger';
import { IsString, MaxLength } from 'class-validator';
import { EmailAddress, Line, MailedTokenText, Password } from '../../common/account-fields';

export class SignUpDto {
  @Line(1, 80)
  name: string;
  @EmailAddress()
  email: string;
  @Password()
  password: string;
  @Line(1, 80)
  workshopName: string;
}

export class SignInDto {
  @EmailAddress()
  email: string;
  @ApiProperty()
  @IsString()
  @MaxLength(200)
  password: string;
}

export class RenameDto {
  @Line(1, 80)
  name: string;
}

export class AskPasswordResetDto {
  @EmailAddress()
  email: string;
}

export class ConfirmPasswordResetDto {
  @MailedTokenText()
  token: string;
  @Password()
  password: string;
}

export class ConfirmEmailDto {
  @MailedTokenText()
  token: string;
}

export class ConfirmedEmailDto {
  @ApiProperty()
  email: string;
}

export class ChangeEmailDto {
  @EmailAddress()
  newEmail: string;
  @ApiProperty()
  @IsString()
  @MaxLength(200)
  password: string;
}
