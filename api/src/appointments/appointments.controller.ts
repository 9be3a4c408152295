import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiForbiddenResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import { SignedIn } from '../common/access/signed-in.decorator.js';
import type { Actor } from '../common/actor.js';
import { AppointmentsService } from './appointments.service.js';
import { AppointmentParams, ConfirmationDto, EndDto, ProposalDto } from './dto/appointment-bodies.dto.js';
import { AppointmentItem, AppointmentsResponse } from './dto/appointments-response.dto.js';

@ApiTags('Appointments')
@Controller('appointments')
export class AppointmentsController {
  constructor(private readonly appointments: AppointmentsService) {}

  @Get()
  @Permission('appointment.read')
  @ApiOperation({
    operationId: 'listAppointments',
    summary: 'Who was appointed technical authority, and how',
  })
  @ApiOkResponse({ type: AppointmentsResponse })
  list(@CurrentActor() actor: Actor): AppointmentsResponse {
    return this.appointments.list(actor);
  }

  @Post()
  @Permission('appointment.propose')
  @ApiOperation({ operationId: 'proposeAppointment', summary: 'Propose a technical authority' })
  @ApiCreatedResponse({ type: AppointmentItem })
  @ApiConflictResponse({ description: 'The person cannot be a technical authority' })
  propose(@CurrentActor() actor: Actor, @Body() body: ProposalDto): AppointmentItem {
    return this.appointments.propose(actor, body);
  }

  @Post(':id/confirmation')
  @SignedIn()
  @ApiOperation({
    operationId: 'confirmAppointment',
    summary: "Confirm a proposal, as another technical authority or as the office's principal",
  })
  @ApiCreatedResponse({ type: AppointmentItem })
  @ApiForbiddenResponse({ description: 'Neither of the two, not a second person, or the wrong password' })
  @ApiNotFoundResponse({ description: 'There is no such appointment' })
  @ApiConflictResponse({ description: 'Confirmed or ended already' })
  confirm(
    @CurrentActor() actor: Actor,
    @Param() path: AppointmentParams,
    @Body() body: ConfirmationDto,
  ): Promise<AppointmentItem> {
    return this.appointments.confirm(actor, path.id, body.password);
  }

  @Post(':id/end')
  @Permission('appointment.end')
  @ApiOperation({ operationId: 'endAppointment', summary: 'End an appointment, or take a proposal back' })
  @ApiCreatedResponse({ type: AppointmentItem })
  @ApiNotFoundResponse({ description: 'There is no such appointment' })
  @ApiConflictResponse({ description: 'It has ended' })
  end(@CurrentActor() actor: Actor, @Param() path: AppointmentParams, @Body() body: EndDto): AppointmentItem {
    return this.appointments.end(actor, path.id, body.reason);
  }
}
