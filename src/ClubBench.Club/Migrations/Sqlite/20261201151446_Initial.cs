using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace ClubBench.Club.Migrations.Sqlite
{
    /// <inheritdoc />
    public partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "clubs",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    TimeZone = table.Column<string>(type: "TEXT", nullable: false),
                    FoundedUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_clubs", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "DataProtectionKeys",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    FriendlyName = table.Column<string>(type: "TEXT", nullable: true),
                    Xml = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_DataProtectionKeys", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "events",
                columns: table => new
                {
                    Ordinal = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    SubjectId = table.Column<Guid>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_events", x => x.Ordinal);
                });

            migrationBuilder.CreateTable(
                name: "instruments",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    Class = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    UncertaintyRelative = table.Column<double>(type: "REAL", nullable: false),
                    UncertaintySi = table.Column<double>(type: "REAL", nullable: false),
                    OffsetSi = table.Column<double>(type: "REAL", nullable: false),
                    OffsetKind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Post = table.Column<string>(type: "TEXT", nullable: false),
                    CheckedOn = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_instruments", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "kits",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    NewestRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_kits", x => new { x.ClubId, x.Id });
                });

            migrationBuilder.CreateTable(
                name: "set_up_tokens",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    TokenHash = table.Column<string>(type: "TEXT", nullable: false),
                    ExpiresUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    UsedUtc = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_set_up_tokens", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "stock_lots",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Class = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Type = table.Column<string>(type: "TEXT", nullable: false),
                    ValueSi = table.Column<double>(type: "REAL", nullable: true),
                    QuantityPieces = table.Column<double>(type: "REAL", nullable: false),
                    Lot = table.Column<string>(type: "TEXT", nullable: false),
                    MayBeTuned = table.Column<bool>(type: "INTEGER", nullable: false),
                    Place = table.Column<string>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_stock_lots", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "people",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    DisplayName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    IsJunior = table.Column<bool>(type: "INTEGER", nullable: false),
                    PasswordHash = table.Column<string>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_people", x => x.Id);
                    table.ForeignKey(
                        name: "FK_people_clubs_ClubId",
                        column: x => x.ClubId,
                        principalTable: "clubs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "group_builds",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    KitId = table.Column<Guid>(type: "TEXT", nullable: false),
                    StartedUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_group_builds", x => x.Id);
                    table.ForeignKey(
                        name: "FK_group_builds_kits_ClubId_KitId",
                        columns: x => new { x.ClubId, x.KitId },
                        principalTable: "kits",
                        principalColumns: new[] { "ClubId", "Id" },
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "kit_revisions",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    KitId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Revision = table.Column<int>(type: "INTEGER", nullable: false),
                    Document = table.Column<string>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_kit_revisions", x => x.Id);
                    table.ForeignKey(
                        name: "FK_kit_revisions_kits_ClubId_KitId",
                        columns: x => new { x.ClubId, x.KitId },
                        principalTable: "kits",
                        principalColumns: new[] { "ClubId", "Id" },
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "plans",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    KitId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    BandName = table.Column<string>(type: "TEXT", nullable: false),
                    NewestRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    IssuedRevision = table.Column<int>(type: "INTEGER", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_plans", x => x.Id);
                    table.ForeignKey(
                        name: "FK_plans_kits_ClubId_KitId",
                        columns: x => new { x.ClubId, x.KitId },
                        principalTable: "kits",
                        principalColumns: new[] { "ClubId", "Id" },
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "api_tokens",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    TokenHash = table.Column<string>(type: "TEXT", nullable: false),
                    PersonId = table.Column<Guid>(type: "TEXT", nullable: false),
                    MadeUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    RevokedUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_api_tokens", x => x.Id);
                    table.ForeignKey(
                        name: "FK_api_tokens_people_PersonId",
                        column: x => x.PersonId,
                        principalTable: "people",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "memberships",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    PersonId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Role = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    SinceUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    EndedUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_memberships", x => x.Id);
                    table.ForeignKey(
                        name: "FK_memberships_people_PersonId",
                        column: x => x.PersonId,
                        principalTable: "people",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "nights",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    GroupBuildId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Title = table.Column<string>(type: "TEXT", nullable: false),
                    Date = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Goals = table.Column<string>(type: "TEXT", nullable: false),
                    State = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    OpenedUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClosedUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    JoinCode = table.Column<string>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_nights", x => x.Id);
                    table.ForeignKey(
                        name: "FK_nights_group_builds_GroupBuildId",
                        column: x => x.GroupBuildId,
                        principalTable: "group_builds",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "boards",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    GroupBuildId = table.Column<Guid>(type: "TEXT", nullable: false),
                    PlanId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Tag = table.Column<string>(type: "TEXT", maxLength: 20, nullable: false),
                    BuilderId = table.Column<Guid>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_boards", x => x.Id);
                    table.ForeignKey(
                        name: "FK_boards_group_builds_GroupBuildId",
                        column: x => x.GroupBuildId,
                        principalTable: "group_builds",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_boards_people_BuilderId",
                        column: x => x.BuilderId,
                        principalTable: "people",
                        principalColumn: "Id");
                    table.ForeignKey(
                        name: "FK_boards_plans_PlanId",
                        column: x => x.PlanId,
                        principalTable: "plans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "cards",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    PlanId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Number = table.Column<int>(type: "INTEGER", nullable: false),
                    ContentHash = table.Column<string>(type: "TEXT", nullable: false),
                    ContentJson = table.Column<string>(type: "TEXT", nullable: false),
                    FirstPlanRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_cards", x => x.Id);
                    table.ForeignKey(
                        name: "FK_cards_plans_PlanId",
                        column: x => x.PlanId,
                        principalTable: "plans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "expected_readings",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    PlanId = table.Column<Guid>(type: "TEXT", nullable: false),
                    PlanRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Point = table.Column<string>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    NominalSi = table.Column<double>(type: "REAL", nullable: false),
                    LowSi = table.Column<double>(type: "REAL", nullable: false),
                    HighSi = table.Column<double>(type: "REAL", nullable: false),
                    Sides = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_expected_readings", x => x.Id);
                    table.ForeignKey(
                        name: "FK_expected_readings_plans_PlanId",
                        column: x => x.PlanId,
                        principalTable: "plans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "plan_revisions",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    PlanId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Revision = table.Column<int>(type: "INTEGER", nullable: false),
                    KitRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    InputsJson = table.Column<string>(type: "TEXT", nullable: false),
                    OutputsJson = table.Column<string>(type: "TEXT", nullable: false),
                    CalculationVersion = table.Column<string>(type: "TEXT", nullable: false),
                    Hash = table.Column<string>(type: "TEXT", nullable: false),
                    State = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    OpenItems = table.Column<int>(type: "INTEGER", nullable: false),
                    Judgement = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_plan_revisions", x => x.Id);
                    table.ForeignKey(
                        name: "FK_plan_revisions_plans_PlanId",
                        column: x => x.PlanId,
                        principalTable: "plans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "attendance",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    NightId = table.Column<Guid>(type: "TEXT", nullable: false),
                    PersonId = table.Column<Guid>(type: "TEXT", nullable: false),
                    CameUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_attendance", x => x.Id);
                    table.ForeignKey(
                        name: "FK_attendance_nights_NightId",
                        column: x => x.NightId,
                        principalTable: "nights",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_attendance_people_PersonId",
                        column: x => x.PersonId,
                        principalTable: "people",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "sign_in_links",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    TokenHash = table.Column<string>(type: "TEXT", nullable: false),
                    PersonId = table.Column<Guid>(type: "TEXT", nullable: true),
                    NightId = table.Column<Guid>(type: "TEXT", nullable: true),
                    ExpiresUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    UsesLeft = table.Column<int>(type: "INTEGER", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_sign_in_links", x => x.Id);
                    table.ForeignKey(
                        name: "FK_sign_in_links_nights_NightId",
                        column: x => x.NightId,
                        principalTable: "nights",
                        principalColumn: "Id");
                    table.ForeignKey(
                        name: "FK_sign_in_links_people_PersonId",
                        column: x => x.PersonId,
                        principalTable: "people",
                        principalColumn: "Id");
                });

            migrationBuilder.CreateTable(
                name: "board_stages",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Progress = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Hold = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_board_stages", x => x.Id);
                    table.ForeignKey(
                        name: "FK_board_stages_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "fitted",
                columns: table => new
                {
                    Ordinal = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Designator = table.Column<string>(type: "TEXT", nullable: false),
                    Turns = table.Column<int>(type: "INTEGER", nullable: true),
                    Type = table.Column<string>(type: "TEXT", nullable: false),
                    Lot = table.Column<string>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_fitted", x => x.Ordinal);
                    table.ForeignKey(
                        name: "FK_fitted_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "help_calls",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Text = table.Column<string>(type: "TEXT", nullable: false),
                    CalledUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    CalledBy = table.Column<Guid>(type: "TEXT", nullable: false),
                    MentorId = table.Column<Guid>(type: "TEXT", nullable: true),
                    AnsweredUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    DoneUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Version = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_help_calls", x => x.Id);
                    table.ForeignKey(
                        name: "FK_help_calls_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "readings",
                columns: table => new
                {
                    Ordinal = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Point = table.Column<string>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    ValueSi = table.Column<double>(type: "REAL", nullable: false),
                    TypedText = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Instrument = table.Column<string>(type: "TEXT", nullable: true),
                    Note = table.Column<string>(type: "TEXT", nullable: false),
                    Replaces = table.Column<Guid>(type: "TEXT", nullable: true),
                    PlanRevision = table.Column<int>(type: "INTEGER", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_readings", x => x.Ordinal);
                    table.ForeignKey(
                        name: "FK_readings_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "stage_events",
                columns: table => new
                {
                    Ordinal = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Progress = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Hold = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Note = table.Column<string>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_stage_events", x => x.Ordinal);
                    table.ForeignKey(
                        name: "FK_stage_events_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "print_log",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    CardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Copies = table.Column<int>(type: "INTEGER", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_print_log", x => x.Id);
                    table.ForeignKey(
                        name: "FK_print_log_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id");
                    table.ForeignKey(
                        name: "FK_print_log_cards_CardId",
                        column: x => x.CardId,
                        principalTable: "cards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "sign_offs",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    MentorId = table.Column<Guid>(type: "TEXT", nullable: false),
                    CardId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Remark = table.Column<string>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    LapsedUtc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_sign_offs", x => x.Id);
                    table.ForeignKey(
                        name: "FK_sign_offs_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_sign_offs_cards_CardId",
                        column: x => x.CardId,
                        principalTable: "cards",
                        principalColumn: "Id");
                    table.ForeignKey(
                        name: "FK_sign_offs_people_MentorId",
                        column: x => x.MentorId,
                        principalTable: "people",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "advice_given",
                columns: table => new
                {
                    Ordinal = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    ReadingOrdinal = table.Column<long>(type: "INTEGER", nullable: false),
                    BoardId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Stage = table.Column<string>(type: "TEXT", nullable: false),
                    Verdict = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    RuleId = table.Column<string>(type: "TEXT", nullable: false),
                    AdviceJson = table.Column<string>(type: "TEXT", nullable: false),
                    ClubId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    By = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_advice_given", x => x.Ordinal);
                    table.ForeignKey(
                        name: "FK_advice_given_boards_BoardId",
                        column: x => x.BoardId,
                        principalTable: "boards",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_advice_given_readings_ReadingOrdinal",
                        column: x => x.ReadingOrdinal,
                        principalTable: "readings",
                        principalColumn: "Ordinal",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateIndex(
                name: "IX_advice_given_BoardId",
                table: "advice_given",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_advice_given_ReadingOrdinal",
                table: "advice_given",
                column: "ReadingOrdinal",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_api_tokens_PersonId",
                table: "api_tokens",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_api_tokens_TokenHash",
                table: "api_tokens",
                column: "TokenHash",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_attendance_NightId_PersonId",
                table: "attendance",
                columns: new[] { "NightId", "PersonId" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_attendance_PersonId",
                table: "attendance",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_board_stages_BoardId_Stage",
                table: "board_stages",
                columns: new[] { "BoardId", "Stage" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_boards_BuilderId",
                table: "boards",
                column: "BuilderId");

            migrationBuilder.CreateIndex(
                name: "IX_boards_GroupBuildId_Tag",
                table: "boards",
                columns: new[] { "GroupBuildId", "Tag" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_boards_PlanId",
                table: "boards",
                column: "PlanId");

            migrationBuilder.CreateIndex(
                name: "IX_cards_PlanId_Stage_Number",
                table: "cards",
                columns: new[] { "PlanId", "Stage", "Number" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_events_ClubId_Ordinal",
                table: "events",
                columns: new[] { "ClubId", "Ordinal" });

            migrationBuilder.CreateIndex(
                name: "IX_expected_readings_PlanId_PlanRevision_Point",
                table: "expected_readings",
                columns: new[] { "PlanId", "PlanRevision", "Point" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_fitted_BoardId",
                table: "fitted",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_fitted_ClubId_BoardId_Id",
                table: "fitted",
                columns: new[] { "ClubId", "BoardId", "Id" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_group_builds_ClubId_KitId",
                table: "group_builds",
                columns: new[] { "ClubId", "KitId" });

            migrationBuilder.CreateIndex(
                name: "IX_help_calls_BoardId",
                table: "help_calls",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_instruments_ClubId_Name",
                table: "instruments",
                columns: new[] { "ClubId", "Name" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_kit_revisions_ClubId_KitId_Revision",
                table: "kit_revisions",
                columns: new[] { "ClubId", "KitId", "Revision" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_memberships_ClubId_PersonId",
                table: "memberships",
                columns: new[] { "ClubId", "PersonId" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_memberships_PersonId",
                table: "memberships",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_nights_GroupBuildId",
                table: "nights",
                column: "GroupBuildId");

            migrationBuilder.CreateIndex(
                name: "IX_nights_JoinCode",
                table: "nights",
                column: "JoinCode",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_people_ClubId",
                table: "people",
                column: "ClubId");

            migrationBuilder.CreateIndex(
                name: "IX_plan_revisions_PlanId_Revision",
                table: "plan_revisions",
                columns: new[] { "PlanId", "Revision" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_plans_ClubId_KitId",
                table: "plans",
                columns: new[] { "ClubId", "KitId" });

            migrationBuilder.CreateIndex(
                name: "IX_print_log_BoardId",
                table: "print_log",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_print_log_CardId",
                table: "print_log",
                column: "CardId");

            migrationBuilder.CreateIndex(
                name: "IX_readings_BoardId",
                table: "readings",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_readings_ClubId_BoardId_Id",
                table: "readings",
                columns: new[] { "ClubId", "BoardId", "Id" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_readings_ClubId_Point",
                table: "readings",
                columns: new[] { "ClubId", "Point" });

            migrationBuilder.CreateIndex(
                name: "IX_set_up_tokens_TokenHash",
                table: "set_up_tokens",
                column: "TokenHash",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_sign_in_links_NightId",
                table: "sign_in_links",
                column: "NightId");

            migrationBuilder.CreateIndex(
                name: "IX_sign_in_links_PersonId",
                table: "sign_in_links",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_sign_in_links_TokenHash",
                table: "sign_in_links",
                column: "TokenHash",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_sign_offs_BoardId",
                table: "sign_offs",
                column: "BoardId");

            migrationBuilder.CreateIndex(
                name: "IX_sign_offs_CardId",
                table: "sign_offs",
                column: "CardId");

            migrationBuilder.CreateIndex(
                name: "IX_sign_offs_MentorId",
                table: "sign_offs",
                column: "MentorId");

            migrationBuilder.CreateIndex(
                name: "IX_stage_events_BoardId_Stage",
                table: "stage_events",
                columns: new[] { "BoardId", "Stage" });

            migrationBuilder.CreateIndex(
                name: "IX_stock_lots_ClubId",
                table: "stock_lots",
                column: "ClubId");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "advice_given");

            migrationBuilder.DropTable(
                name: "api_tokens");

            migrationBuilder.DropTable(
                name: "attendance");

            migrationBuilder.DropTable(
                name: "board_stages");

            migrationBuilder.DropTable(
                name: "DataProtectionKeys");

            migrationBuilder.DropTable(
                name: "events");

            migrationBuilder.DropTable(
                name: "expected_readings");

            migrationBuilder.DropTable(
                name: "fitted");

            migrationBuilder.DropTable(
                name: "help_calls");

            migrationBuilder.DropTable(
                name: "instruments");

            migrationBuilder.DropTable(
                name: "kit_revisions");

            migrationBuilder.DropTable(
                name: "memberships");

            migrationBuilder.DropTable(
                name: "plan_revisions");

            migrationBuilder.DropTable(
                name: "print_log");

            migrationBuilder.DropTable(
                name: "set_up_tokens");

            migrationBuilder.DropTable(
                name: "sign_in_links");

            migrationBuilder.DropTable(
                name: "sign_offs");

            migrationBuilder.DropTable(
                name: "stage_events");

            migrationBuilder.DropTable(
                name: "stock_lots");

            migrationBuilder.DropTable(
                name: "readings");

            migrationBuilder.DropTable(
                name: "nights");

            migrationBuilder.DropTable(
                name: "cards");

            migrationBuilder.DropTable(
                name: "boards");

            migrationBuilder.DropTable(
                name: "group_builds");

            migrationBuilder.DropTable(
                name: "people");

            migrationBuilder.DropTable(
                name: "plans");

            migrationBuilder.DropTable(
                name: "clubs");

            migrationBuilder.DropTable(
                name: "kits");
        }
    }
}
