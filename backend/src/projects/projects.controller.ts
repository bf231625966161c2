import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import type { SessionUser } from '../common/session-user';
import { CreateProjectDto } from './dto/create-project.dto';
import { ProjectDto, ProjectListItemDto } from './dto/project.dto';
import { UpdateProjectDto } from './dto/update-project.dto';
import { ProjectsService } from './projects.service';

@ApiTags('projects')
@Controller('projects')
export class ProjectsController {
  constructor(private readonly projects: ProjectsService) {}

  @Get()
  @ApiOkResponse({ type: [ProjectListItemDto] })
  findAll(@CurrentUser() user: SessionUser): Promise<ProjectListItemDto[]> {
    return this.projects.findAll(user);
  }

  @Post()
  @ApiCreatedResponse({ type: ProjectDto })
  create(@CurrentUser() user: SessionUser, @Body() dto: CreateProjectDto): Promise<ProjectDto> {
    return this.projects.create(user, dto);
  }

  @Get(':id')
  @ApiOkResponse({ type: ProjectDto })
  findOne(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<ProjectDto> {
    return this.projects.findOne(user, id);
  }

  @Patch(':id')
  @ApiOkResponse({ type: ProjectDto })
  update(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() dto: UpdateProjectDto,
  ): Promise<ProjectDto> {
    return this.projects.update(user, id, dto);
  }

  @Delete(':id')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<void> {
    return this.projects.remove(user, id);
  }
}
