import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { Strategy } from 'passport-local';
import { PasswordsService } from './passwords.service.js';
import type { PersonRow } from './person.entity.js';

/** Who signs in: by e-mail and password. */
@Injectable()
export class PasswordStrategy extends PassportStrategy(Strategy, 'password') {
  constructor(private readonly passwords: PasswordsService) {
    super({ usernameField: 'email', passwordField: 'password', session: false });
  }

  validate(email: string, password: string): Promise<PersonRow | null> {
    return this.passwords.personFor(email, password);
  }
}
