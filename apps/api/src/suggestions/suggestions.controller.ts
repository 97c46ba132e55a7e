import { Body, Controller, Delete, Get, HttpCode, Post } from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiConflictResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { StartSuggestionDto } from './dto/start-suggestion.dto';
import { SuggestionDto, SuggestionListDto } from './dto/suggestion.dto';
import { SuggestionsService } from './suggestions.service';

/**
 * Dimensions that serve everybody named, and then most of a population. Every member reads what was found; how many
 * millimetres somebody misses is for owner and designer only.
 */
@ApiTags('suggestions')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/suggestions')
export class SuggestionsController {
  constructor(private readonly suggestions: SuggestionsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: SuggestionListDto })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<SuggestionListDto> {
    return { items: await this.suggestions.list(member, productionId, setId) };
  }

  /** Starts a search, which workers do. While the same one is not done, the answer is that one. */
  @Post()
  @HttpCode(202)
  @Access('owner', 'designer')
  @ApiAcceptedResponse({ type: SuggestionDto })
  @ApiConflictResponse({ description: 'the draft moved on, or too many searches are not done yet' })
  start(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() body: StartSuggestionDto,
  ): Promise<SuggestionDto> {
    return this.suggestions.start(member, productionId, setId, body);
  }

  @Get(':suggestionId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: SuggestionDto, description: 'with the answers found so far' })
  get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('suggestionId') suggestionId: string,
  ): Promise<SuggestionDto> {
    return this.suggestions.get(member, productionId, setId, suggestionId);
  }

  @Post(':suggestionId/cancel')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: SuggestionDto, description: 'the answers found by then stay' })
  @ApiConflictResponse({ description: 'it has ended already' })
  cancel(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('suggestionId') suggestionId: string,
  ): Promise<SuggestionDto> {
    return this.suggestions.cancel(member, productionId, setId, suggestionId);
  }

  @Delete(':suggestionId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse()
  remove(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('suggestionId') suggestionId: string,
  ): Promise<void> {
    return this.suggestions.remove(member, productionId, setId, suggestionId);
  }
}
